import { modelLine } from '../deck/deck-number';
import type { NetlistPart } from '../netlist';
import { instanceParameters, nodesOf, numberOf } from './element-line';
import type { KindDeck } from './kind';

/** Current gain that stands in an exchanged deck when no h_FE is known; the engine's own model says so as an assumption. */
const assumedGain = 100;

function gainOf(part: NetlistPart): number {
  return numberOf(part, 'hfe_typ') ?? numberOf(part, 'hfe_min') ?? assumedGain;
}

/** Deck half of a bipolar transistor: `Q1 c b e Q1_BJT` with a card made from its ratings, or the part's own card. */
export function bipolarDeck(type: 'npn' | 'pnp'): KindDeck {
  return {
    letterOf: () => 'Q',
    pinOrder: ['C', 'B', 'E', 'S'],
    read: (element, modelType) => element.letter === 'Q' && modelType === type,
    write(part, name, node) {
      const card = part.model ?? `${name}_BJT`;
      const element = `${name} ${nodesOf(part, ['C', 'B', 'E'], node)} ${card}${instanceParameters(part)}`;
      if (part.model !== undefined) return [element];
      return [element, modelLine(card, type, { is: 1e-14, bf: gainOf(part), vaf: 100, br: 4 })];
    },
  };
}
