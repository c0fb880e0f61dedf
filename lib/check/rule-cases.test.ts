import { existsSync, readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { afterAll, describe, expect, test, vi } from 'vitest';
import { failsByEvidence } from '@/lib/netlist/findings/verdict';
import { isWorse } from '@/lib/netlist/rules/collect';
import { applyRemedy } from '@/lib/netlist/rules/apply-remedy';
import { ruleRegistry } from '@/lib/netlist/rules/registry';
import type { RuleCase } from '@/lib/netlist/rules/testing/rule-case';
import { createNodeEngine } from '@/lib/spice/node-engine';
import { cachingEngine, PointCache } from './caching-engine';
import { checkNetlist } from './check-netlist';
import { netlistOfCase } from './testing/case-netlist';
import { findingsOf } from './testing/judged-case';

// The engine takes seconds to start on a busy machine.
vi.setConfig({ testTimeout: 60_000 });

const folder = path.join(process.cwd(), 'lib/netlist/rules');
const node = createNodeEngine();
const engine = cachingEngine(node, new PointCache());
afterAll(() => node.dispose());

const ruleFolders = readdirSync(folder, { withFileTypes: true })
  .filter((entry) => entry.isDirectory() && existsSync(path.join(folder, entry.name, 'rule.ts'))).map(({ name }) => name);
const headings = ['What it catches', 'Why it matters', 'How it decides', 'Facts it needs', 'Fails', 'Passes', 'When to accept it', 'Limits', 'Sources'];
const tables = import.meta.glob<{ readonly cases: readonly RuleCase[] }>('../netlist/rules/*/cases.ts');

test('every rule folder is registered, and every registered rule has a folder', () => {
  expect(ruleRegistry.map(({ id }) => id).sort()).toEqual([...ruleFolders].sort());
});

describe.each(ruleRegistry.map((rule) => [rule.id, rule] as const))('%s', async (id, rule) => {
  const load = tables[`../netlist/rules/${id}/cases.ts`];
  const { cases } = load ? await load() : { cases: [] };

  test('has a page with every section', () => {
    const page = readFileSync(path.join(folder, id, 'doc.md'), 'utf8');
    expect(headings.filter((heading) => !page.includes(`## ${heading}`))).toEqual([]);
  });

  test('says what its parameters mean and where they come from', () => {
    for (const parameter of Object.values(rule.parameters)) {
      expect(parameter.words).not.toBe('');
      expect(parameter.source).not.toBe('');
    }
  });

  test('has at least three cases that fail, three that pass and one that is not its business', () => {
    const count = (...outcomes: readonly string[]) => cases.filter(({ expect: { outcome } }) => outcomes.includes(outcome)).length;
    expect(count('fail')).toBeGreaterThanOrEqual(3);
    expect(count('pass')).toBeGreaterThanOrEqual(3);
    expect(count('none', 'not applicable')).toBeGreaterThanOrEqual(1);
  });

  test('has a row that every parameter changes', () => {
    const changed = new Set(cases.flatMap(({ parameters }) => Object.keys(parameters ?? {})));
    expect(Object.keys(rule.parameters).filter((name) => !changed.has(name))).toEqual([]);
  });

  test.each(cases.map((row) => [row.name, row] as const))('%s', async (_name, row) => {
    const findings = await findingsOf(rule, netlistOfCase(row), engine, row.parameters);
    const worst = findings[0];
    const { outcome, severity, refs, says, holdPoint, state } = row.expect;
    expect({ outcome: worst?.outcome ?? 'none', message: worst?.message }).toEqual({ outcome, message: worst?.message });
    if (severity !== undefined) expect(worst?.severity).toBe(severity);
    if (refs !== undefined) expect(worst?.refs).toEqual(refs);
    if (says !== undefined) expect(worst?.message.replaceAll('\u2009', ' ')).toMatch(says);
    if (holdPoint !== undefined) expect(worst?.holdPoint).toBe(holdPoint);
    if (state !== undefined) expect(worst?.state).toBe(state);
    for (const finding of findings) {
      if (finding.outcome === 'fail') {
        expect(failsByEvidence(finding.evidence), `${finding.message}: its evidence must show the fail`).toBe(true);
        expect(finding.refs.length + finding.nets.length).toBeGreaterThan(0);
        expect(finding.refs.length).toBeLessThanOrEqual(4);
      }
      if (finding.outcome === 'pass') expect(failsByEvidence(finding.evidence), `${finding.message}: its evidence must not show a fail`).toBe(false);
    }
  });

  const remedied = cases.filter((row) => row.expect.outcome === 'fail' && row.parameters === undefined);
  test.each(remedied.map((row) => [row.name, row] as const))('proposed change: %s', async (_name, row) => {
    const netlist = netlistOfCase(row);
    const finding = (await findingsOf(rule, netlist, engine))[0];
    const edits = finding?.remedy?.edits;
    if (!finding || !edits) return;
    const before = (await checkNetlist(netlist, { engine })).findings;
    const after = (await checkNetlist(applyRemedy(netlist, edits), { engine })).findings.filter(({ outcome }) => outcome === 'fail');
    expect(after.find(({ fingerprint }) => fingerprint === finding.fingerprint)?.message).toBeUndefined();
    const stood = new Map(before.filter(({ outcome }) => outcome === 'fail').map(({ fingerprint, severity }) => [fingerprint, severity]));
    const worse = after.filter(({ severity, fingerprint }) => {
      const earlier = stood.get(fingerprint);
      return severity !== 'advice' && (earlier === undefined || isWorse(severity, earlier));
    });
    expect(worse.map(({ message }) => message)).toEqual([]);
  });
});
