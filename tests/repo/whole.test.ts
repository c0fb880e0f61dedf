import { readdirSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { kindIds } from '@/lib/netlist/kinds/kind-id';
import { root, trackedFiles } from './tracked-files';

const foldersIn = (folder: string): readonly string[] =>
  readdirSync(path.join(root, folder), { withFileTypes: true }).filter((entry) => entry.isDirectory()).map((entry) => entry.name);

describe('kinds', () => {
  it('have a folder each, and no folder is without a kind', () => {
    expect([...foldersIn('lib/netlist/kinds')].toSorted()).toEqual([...kindIds].toSorted());
  });

  it.each(kindIds)('%s has all halves', (id) => {
    const files = readdirSync(path.join(root, 'lib/netlist/kinds', id));
    expect(files).toEqual(expect.arrayContaining(['kind.ts', 'deck.ts', 'symbol.ts', 'engine.ts']));
  });
});

describe('rules', () => {
  const ruleFolders = trackedFiles().map((file) => /^lib\/netlist\/rules\/([a-z0-9-]+)\/rule\.ts$/.exec(file)?.[1]).filter((name) => name !== undefined);

  it('are there', () => expect(ruleFolders.length).toBeGreaterThan(0));

  it.each(ruleFolders)('%s has its cases', (id) => {
    const files = readdirSync(path.join(root, 'lib/netlist/rules', id));
    expect(files.some((file) => file.endsWith('.test.ts') || file.startsWith('cases'))).toBe(true);
  });
});
