import { byCodeUnit } from '../designators/designator';

/** The same entries in code-unit order of their keys, undefined ones left out. */
export function sortedByKey<T extends Readonly<Record<string, unknown>>>(record: T): T {
  const entries = Object.entries(record).filter(([, value]) => value !== undefined);
  return Object.fromEntries(entries.sort(([a], [b]) => byCodeUnit(a, b))) as T;
}
