import { schemaVersion, type StoredSheet } from '../stored-sheet';
import { migrations, type Migration } from './migration';

export class UnknownSchemaError extends Error {
  constructor(readonly version: number, readonly known: number) {
    super(`This sheet was written with layout ${version}; this program knows layouts up to ${known}. Update the program.`);
    this.name = 'UnknownSchemaError';
  }
}

/** Layout of a stored sheet; an empty document counts as the newest. */
export function versionOf(stored: StoredSheet): number {
  const { schema } = stored.meta;
  return typeof schema === 'number' && Number.isInteger(schema) && schema >= 1 ? schema : schemaVersion;
}

/**
 * The stored sheet in layout `target`, up or down, step by step.
 * Throws `UnknownSchemaError` when either layout is newer than the steps known.
 */
export function migrate(stored: StoredSheet, target: number = schemaVersion, steps: readonly Migration[] = migrations): StoredSheet {
  const newest = 1 + steps.length;
  let version = versionOf(stored);
  if (version > newest) throw new UnknownSchemaError(version, newest);
  if (target > newest || target < 1) throw new UnknownSchemaError(target, newest);
  let current = stored;
  while (version < target) {
    current = stepOf(steps, version + 1).up(current);
    version += 1;
  }
  while (version > target) {
    current = stepOf(steps, version).down(current);
    version -= 1;
  }
  return current === stored ? stored : { ...current, meta: { ...current.meta, schema: target } };
}

function stepOf(steps: readonly Migration[], version: number): Migration {
  const step = steps[version - 2];
  if (!step || step.version !== version) throw new Error(`The step to layout ${version} is missing.`);
  return step;
}
