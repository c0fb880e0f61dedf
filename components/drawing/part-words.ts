import type { PartRecord } from '@/lib/document/records';
import { formatFact } from '@/lib/netlist/facts/read-fact';
import { kindRegistry } from '@/lib/netlist/kinds/kind-registry';

/** What stands beside a symbol: the designator and the facts its kind prints. Marks that carry their own words have none. */
export function partWords(part: PartRecord): { readonly ref: string | null; readonly values: readonly string[] } {
  if (part.kind === 'net-name' || part.kind === 'note') return { ref: null, values: [] };
  const kind = kindRegistry[part.kind];
  const values = kind.printed.flatMap((key) => {
    const value = part.facts[key];
    return value === undefined ? [] : [formatFact(kind, key, value)];
  });
  return { ref: kind.letter === null && part.kind !== 'box' ? null : part.ref, values };
}

/** The words that a net name or a note carries itself. */
export function ownWords(part: PartRecord): string {
  const fact = part.kind === 'net-name' ? part.facts['name'] : part.facts['text'];
  return typeof fact === 'string' ? fact : '';
}
