import type { FactKey } from '../facts/fact-registry';
import type { ModelCard, Netlist, NetlistPart } from '../netlist';
import { isFet } from './part-nature';

/** The fact that a part's card stands for, where the part does not give it itself. */
function factOfCard(part: NetlistPart, card: ModelCard): { readonly fact: FactKey; readonly value: number } | null {
  if (isFet(part)) {
    const volts = card.params.vto ?? card.params.vt0 ?? card.params.vth0 ?? card.params.vth;
    const enhances = volts !== undefined && (part.kind === 'pmos' ? volts < 0 : volts > 0);
    return enhances ? { fact: 'vth_typ', value: Math.abs(volts) } : null;
  }
  const breakdown = part.kind === 'zener' ? card.params.bv : undefined;
  return breakdown === undefined || breakdown === 0 ? null : { fact: 'vz', value: Math.abs(breakdown) };
}

/**
 * The netlist with what model cards say in place of facts that nobody typed: VTO as the typical threshold, a zener's BV as
 * its voltage, both marked 'model card' (`docs/rules.md`, "Catalogue"). A fact line beats a card.
 */
export function withCardFacts(netlist: Netlist): Netlist {
  if (netlist.models.length === 0) return netlist;
  const cards = new Map(netlist.models.map((card) => [card.name.toLowerCase(), card]));
  const parts = netlist.parts.map((part): NetlistPart => {
    const card = part.model === undefined ? undefined : cards.get(part.model.toLowerCase());
    const found = card ? factOfCard(part, card) : null;
    if (!found || part.facts[found.fact] !== undefined) return part;
    return { ...part, facts: { ...part.facts, [found.fact]: found.value }, origins: { ...part.origins, [found.fact]: 'model card' } };
  });
  return { ...netlist, parts };
}
