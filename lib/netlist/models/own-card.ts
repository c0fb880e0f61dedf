import type { Corner } from '../kinds/kind-engine';
import type { Facts, ModelCard } from '../netlist';
import { magnitude } from './fact-number';

/** Temperature at which a card of one's own counts as measured unless it says so, °C (ngspice's default). */
const cardTemperature = 27;

/** A card that a deck brought, ready for a run whose other models stand for 25 °C. */
export function ownCard(card: ModelCard): Omit<ModelCard, 'name'> {
  return { type: card.type, flags: card.flags, params: { tnom: cardTemperature, ...card.params } };
}

/**
 * A transistor's own card at a threshold corner: VTO alone moves, by the facts, from the typical one (the fact's, else
 * the card's own) to the corner's. Without a fact for the corner the card stays as it is. Source: docs/engine.md 3.
 */
export function ownCardAtCorner(card: ModelCard, facts: Facts, corner: Corner): Omit<ModelCard, 'name'> {
  const own = ownCard(card);
  const wanted = corner === 'typ' ? undefined : magnitude(facts, corner === 'min' ? 'vth_min' : 'vth_max');
  const vto = card.params.vto ?? card.params.vth0;
  if (wanted === undefined || vto === undefined) return own;
  const typical = magnitude(facts, 'vth_typ') ?? Math.abs(vto);
  const sign = card.type === 'pmos' || card.flags.includes('pchan') ? -1 : 1;
  return { ...own, params: { ...own.params, vto: vto + sign * (wanted - typical) } };
}
