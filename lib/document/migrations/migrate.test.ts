import { describe, expect, it } from 'vitest';
import type * as Y from 'yjs';
import { decodeDocument, encodeSheet } from '../encode-sheet';
import { schemaVersion, type StoredSheet } from '../stored-sheet';
import { gateStage } from '../testing/gate-stage';
import { migrateDocument, storedSheetOf } from './migrate-document';
import { migrate, UnknownSchemaError } from './migrate';
import { migrations, type Migration } from './migration';

/** A step of the kind that will come: a key gets another name. */
function renameKey(version: number, from: string, to: string): Migration {
  const rename = (stored: StoredSheet, old: string, fresh: string): StoredSheet => ({
    ...stored,
    collections: {
      ...stored.collections,
      parts: Object.fromEntries(Object.entries(stored.collections.parts).map(([id, { [old]: value, ...rest }]) => [id, { ...rest, [fresh]: value ?? null }])),
    },
  });
  return { version, title: `${from} is called ${to}`, up: (stored) => rename(stored, from, to), down: (stored) => rename(stored, to, from) };
}

const steps = [renameKey(2, 'turn', 'quarter'), renameKey(3, 'quarter', 'angle')];
const stage = () => decodeDocument([encodeSheet(gateStage())]);

describe('migrations', () => {
  it('go up one by one and come back to the same sheet', () => {
    const before = storedSheetOf(stage());
    const up = migrate(before, 3, steps);
    expect(up.collections.parts.L1).toMatchObject({ angle: 90 });
    expect(up.meta.schema).toBe(3);
    expect(migrate(up, 1, steps)).toEqual(before);
  });

  it('change the document in one transaction and touch nothing else', () => {
    const doc = stage();
    const transactions: Y.Transaction[] = [];
    doc.on('afterTransaction', (transaction: Y.Transaction) => transactions.push(transaction));
    expect(migrateDocument(doc, 2, steps)).toBe(true);
    expect(transactions).toHaveLength(1);
    expect(storedSheetOf(doc).collections.parts.L1).toMatchObject({ quarter: 90, x: 300 });
    expect(migrateDocument(doc, 2, steps)).toBe(false);
  });

  it('refuse a sheet from a newer program', () => {
    const doc = stage();
    doc.getMap('meta').set('schema', 9);
    expect(() => migrate(storedSheetOf(doc), 1, steps)).toThrow(UnknownSchemaError);
  });

  it('form a whole chain up to the layout in force, each with its way back', () => {
    expect(migrations.map((step) => step.version)).toEqual(migrations.map((_, index) => index + 2));
    expect(schemaVersion).toBe(1 + migrations.length);
    const before = storedSheetOf(stage());
    expect(migrate(migrate(before, schemaVersion), 1)).toEqual(migrate(before, 1));
  });
});
