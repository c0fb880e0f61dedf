import type { PartRecord, Sheet } from '@/lib/document/records';

const sources: ReadonlySet<string> = new Set(['dc-source', 'dc-supply', 'ac-mains', 'signal-generator']);

/** Sources of a sheet by designator: what a scenario sets and a hold point raises. */
export function sourcesOf(sheet: Sheet): readonly PartRecord[] {
  return sheet.parts.filter((part) => sources.has(part.kind)).sort((a, b) => a.ref.localeCompare(b.ref, 'en', { numeric: true }));
}
