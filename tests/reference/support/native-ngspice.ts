import { spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { parseRawFile, type RawPlot } from '@/lib/spice/protocol/raw-file';

/**
 * Debian's ngspice in batch mode on a deck of the tests' own. Never on a deck that a person wrote: unlike the product's
 * engine it can read files and run commands (docs/engine.md 1.6).
 */
export function nativePlot(deck: string): RawPlot {
  const folder = mkdtempSync(path.join(tmpdir(), 'reference-'));
  try {
    writeFileSync(path.join(folder, 'deck.cir'), deck);
    const run = spawnSync('ngspice', ['-b', '-r', 'out.raw', 'deck.cir'], { cwd: folder, timeout: 30_000, encoding: 'utf8' });
    if (run.error) throw run.error;
    const plot = parseRawFile(new Uint8Array(readFileSync(path.join(folder, 'out.raw'))));
    if (plot === null) throw new Error(`ngspice wrote no result: ${run.stderr}`);
    return plot;
  } finally {
    rmSync(folder, { recursive: true });
  }
}

/** Node voltages and branch currents of native ngspice's operating point, by raw-file name. */
export function nativePoint(lines: readonly string[]): Readonly<Record<string, number>> {
  const plot = nativePlot(['reference', ...lines, '.end', ''].join('\n'));
  return Object.fromEntries([...plot.real].map(([name, values]) => [name, values[0] ?? Number.NaN]));
}
