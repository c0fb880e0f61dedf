import { deckNumber } from '../../deck/deck-number';
import type { KindDeck } from '../kind';
import { instanceParameters, nodesOf, numberOf } from '../element-line';

/**
 * A box stands as the element it came as: `X` with its subcircuit, `I` with its amps, any other with the words that
 * followed its nodes. Its pins are its own, in order.
 */
export const boxDeck: KindDeck = {
  letterOf: (part) => (typeof part.facts.element === 'string' ? part.facts.element : 'X'),
  pinOrder: [],
  write(part, name, node) {
    const nodes = nodesOf(part, Object.keys(part.pins), node);
    const amps = numberOf(part, 'value');
    const wave = part.wave ? ` ${part.wave.shape.toUpperCase()}(${part.wave.args.map(deckNumber).join(' ')})` : '';
    const words = [
      part.model, amps === undefined ? undefined : `DC ${deckNumber(amps)}`,
      typeof part.facts.text === 'string' ? part.facts.text : undefined,
    ].filter((word) => word !== undefined);
    return [`${[name, nodes, ...words].join(' ')}${wave}${instanceParameters(part)}`];
  },
};
