import { describe, expect, it } from 'vitest';
import { buildNetlist } from '@/lib/netlist/connectivity/build-netlist';
import type { CheckResult } from './check-netlist';
import { LiveChecker, type LiveFindings } from './live-checker';

const netlist = (title: string) => buildNetlist({ title, parts: [], joins: [], scenarios: [], holdPoints: [], models: [], subcircuits: [] });
const engine = { simulate: () => Promise.reject(new Error('not asked for')) };
const result = { findings: [], points: { stations: [], ok: [], refused: [], at: () => [] } } as unknown as CheckResult;

function gate() {
  const opened: (() => void)[] = [];
  const checked: string[] = [];
  return { checked, check: (given: { title: string }) => new Promise<CheckResult>((done) => { checked.push(given.title); opened.push(() => done(result)); }), open: () => opened.shift()?.() };
}
const settle = () => new Promise<void>((done) => { setImmediate(done); });

describe('LiveChecker', () => {
  it('tells topology at once and the rest when the engine answers', async () => {
    const told: LiveFindings[] = [];
    const { check, open } = gate();
    const checker = new LiveChecker(engine, (findings) => told.push(findings), check);
    checker.take(netlist('a'));
    expect(told.map(({ state }) => state)).toEqual(['topology']);
    open();
    await settle();
    expect(told.map(({ state }) => state)).toEqual(['topology', 'complete']);
  });

  it('checks the last of several sheets that come while one runs, and no other', async () => {
    const { check, checked, open } = gate();
    const checker = new LiveChecker(engine, () => undefined, check);
    for (const title of ['a', 'b', 'c', 'd']) checker.take(netlist(title));
    open();
    await settle();
    open();
    await settle();
    expect(checked).toEqual(['a', 'd']);
  });

  it('costs nothing for a sheet that says the same', () => {
    const told: LiveFindings[] = [];
    const checker = new LiveChecker(engine, (findings) => told.push(findings), gate().check);
    checker.take(netlist('a'));
    checker.take(netlist('a'));
    expect(told).toHaveLength(1);
  });

  it('says when the engine could not answer, and keeps what topology decides', async () => {
    const told: LiveFindings[] = [];
    const checker = new LiveChecker(engine, (findings) => told.push(findings), () => Promise.reject(new Error('gone')));
    checker.take(netlist('a'));
    await settle();
    expect(told.at(-1)?.state).toBe('failed');
  });
});
