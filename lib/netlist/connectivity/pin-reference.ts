import type { Facts } from '../netlist';

/**
 * A pin as people write it, `Q1:G` (IEC 61666). A contact of a plug is a numbered pin of it with two sides: `J1:2/1` is the first
 * side of contact 2.
 */
export function pinReference(part: { readonly ref: string; readonly facts: Facts }, pin: string): string {
  const { contact } = part.facts;
  return contact === undefined ? `${part.ref}:${pin}` : `${part.ref}:${String(contact)}/${pin}`;
}
