import type { FlatRecord, FlatValue } from '../stored-sheet';

/** Two ways between a record as the editor sees it and its flat stored form. */
export interface Codec<T extends { readonly id: string }> {
  toFlat(record: T): FlatRecord;
  /** The record, or why it cannot be one. Unknown keys are ignored. Never throws. */
  fromFlat(id: string, flat: FlatRecord): Decoded<T>;
}

export type Decoded<T> = { readonly ok: true; readonly record: T } | { readonly ok: false; readonly reason: string };

/** Keys `prefix:<name>` of a flat record as an object by name. */
export function gather(flat: FlatRecord, prefix: string): Record<string, FlatValue> {
  const start = `${prefix}:`;
  const found: Record<string, FlatValue> = {};
  for (const key of Object.keys(flat).sort()) {
    if (key.startsWith(start)) found[key.slice(start.length)] = flat[key] as FlatValue;
  }
  return found;
}

/** The opposite of `gather`. Values that are undefined are left out. */
export function spread(values: Readonly<Record<string, unknown>>, prefix: string): Record<string, FlatValue> {
  const flat: Record<string, FlatValue> = {};
  for (const [name, value] of Object.entries(values)) {
    if (value !== undefined) flat[`${prefix}:${name}`] = value as FlatValue;
  }
  return flat;
}

/** First problem of a failed parse, in words: `x: Expected …`. */
export function reasonOf(error: { readonly issues: readonly { readonly path: readonly PropertyKey[]; readonly message: string }[] }): string {
  const issue = error.issues[0];
  return issue ? `${issue.path.join('.')}: ${issue.message}` : 'not a record';
}
