import { execFile } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { promisify } from 'node:util';
import * as Y from 'yjs';
import { PointCache } from '@/lib/check/caching-engine';
import { checkNetlist } from '@/lib/check/check-netlist';
import { checkTopology } from '@/lib/check/check-topology';
import { readSheet } from '@/lib/document/read-sheet';
import { sheetToNetlist } from '@/lib/document/nets/sheet-to-netlist';
import type { Sheet } from '@/lib/document/records';
import { emptySheet, writeSheet } from '@/lib/document/write-sheet';
import { writeDeck } from '@/lib/netlist/deck/write-deck';
import { createNodeEngine } from '@/lib/spice/node-engine';
import { figure, quantile, report } from './support/figures';
import { manyStages } from './support/many-stages';

/**
 * From an edit of the document to findings, as the page does it: read the sheet, build the netlist, run the rules. The edit
 * changes one resistor each time, so nothing is answered from memory. Native ngspice gets the same circuit as one deck.
 */
const run = promisify(execFile);
const rounds = 60;
const warmUp = 20;

/** A document that each call edits by one value. */
function edited(parts: number): () => Y.Doc {
  const doc = new Y.Doc();
  writeSheet(doc, emptySheet, manyStages(parts));
  let value = 20_000;
  return () => {
    const { sheet } = readSheet(doc);
    value += 10;
    const changed: Sheet = { ...sheet, parts: sheet.parts.map((part) => (part.ref === 'R12' ? { ...part, facts: { ...part.facts, value } } : part)) };
    writeSheet(doc, sheet, changed);
    return doc;
  };
}

async function measured(work: () => unknown | Promise<unknown>, prepare: () => void): Promise<number[]> {
  const samples: number[] = [];
  for (let round = 0; round < warmUp + rounds; round += 1) {
    prepare();
    const started = performance.now();
    await work();
    if (round >= warmUp) samples.push(performance.now() - started);
  }
  return samples;
}

async function topology(parts: number): Promise<number[]> {
  const edit = edited(parts);
  let doc = edit();
  return measured(() => checkTopology(sheetToNetlist(readSheet(doc).sheet)), () => { doc = edit(); });
}

const engine = createNodeEngine();
await engine.warm();
const edit = edited(30);
const cache = new PointCache();
let doc = edit();
let points = 0;
const everything = await measured(async () => {
  const result = await checkNetlist(sheetToNetlist(readSheet(doc).sheet), { engine, cache });
  points = result.points.ok.length;
}, () => { doc = edit(); });

const folder = mkdtempSync(path.join(tmpdir(), 'holdoff-bench-'));
const deck = path.join(folder, 'stage.cir');
writeFileSync(deck, writeDeck(sheetToNetlist(readSheet(doc).sheet)));
const native = await measured(() => run('ngspice', ['-b', deck]), () => {});

const [thirty, threeHundred] = [await topology(30), await topology(300)];
report([
  figure('edit to topology findings, 30 parts', thirty, 'ms', { atMost: 16 }),
  figure('edit to topology findings, 300 parts', threeHundred, 'ms', { atMost: 50 }),
  figure('edit to all findings, 30 parts, engine warm', everything, 'ms', { atMost: 150 }),
  figure('starting native ngspice -b on the same deck, one operating point', native, 'ms'),
  figure('ratio of medians, all findings to one native start', [quantile(everything, 0.5) / quantile(native, 0.5)], '×'),
  figure(`ratio of medians, all findings to a native start for each of its ${points} operating points`, [quantile(everything, 0.5) / (points * quantile(native, 0.5))], '×'),
]);
rmSync(folder, { recursive: true, force: true });
await engine.dispose();
