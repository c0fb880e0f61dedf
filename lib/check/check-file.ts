import { existsSync } from 'node:fs';
import { readFile } from 'node:fs/promises';
import path from 'node:path';
import type { PointEngine } from '@/lib/netlist/engine-deck/engine-port';
import { checkDeck, type DeckReport } from './check-deck';

export interface FileReport extends DeckReport {
  /** As given on the command line. */
  readonly file: string;
}

export interface FileCheck {
  readonly report: FileReport;
  readonly readable: boolean;
}

const nothing: DeckReport = { findings: [], undetermined: [], errors: [], notices: [], op: {} };

function whyUnreadable(cause: unknown): string {
  const code = cause instanceof Error && 'code' in cause ? cause.code : undefined;
  if (code === 'ENOENT') return 'There is no such file.';
  if (code === 'EISDIR') return 'This is a folder; name a deck file.';
  if (code === 'EACCES') return 'This file may not be read.';
  return cause instanceof Error ? cause.message : String(cause);
}

/** The file's place: its name from the first of the folders that holds it. */
const placeOf = (file: string, folders: readonly string[]): string =>
  folders.map((folder) => path.resolve(folder, file)).find((place) => existsSync(place)) ?? file;

/** Checks one deck file. A file that cannot be opened or read answers empty lists and why. */
export async function checkFile(file: string, engine: PointEngine, folders: readonly string[] = []): Promise<FileCheck> {
  let text: string;
  try {
    text = await readFile(placeOf(file, folders), 'utf8');
  } catch (cause) {
    return { readable: false, report: { file, ...nothing, errors: [{ line: 0, reason: whyUnreadable(cause) }] } };
  }
  const { report, readable } = await checkDeck(text, engine);
  return { readable, report: { file, ...report } };
}
