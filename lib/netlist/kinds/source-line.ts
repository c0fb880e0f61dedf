import { deckNumber } from '../deck/deck-number';
import type { NetlistPart, Wave } from '../netlist';
import { nodesOf, numberOf } from './element-line';
import type { KindDeck } from './kind';

/** `PULSE(0 10 …)`. */
function waveWords(wave: Wave): string {
  return `${wave.shape.toUpperCase()}(${wave.args.map(deckNumber).join(' ')})`;
}

/**
 * Deck half of a voltage source. `waveOf` gives the wave of a part that a form describes by its facts; a wave brought
 * by a deck stands as it is. A source without a DC value and with a wave carries the wave alone.
 */
export function voltageSourceDeck(
  pins: readonly [string, string],
  waveOf: (part: NetlistPart) => Wave | undefined,
  read?: KindDeck['read'],
): KindDeck {
  return {
    letterOf: () => 'V',
    pinOrder: pins,
    placeholder: 0,
    ...(read ? { read } : {}),
    write(part, name, node) {
      const wave = part.wave ?? waveOf(part);
      const volts = numberOf(part, 'value');
      const dc = volts !== undefined || wave === undefined ? [`DC ${deckNumber(volts ?? 0)}`] : [];
      return [[`${name} ${nodesOf(part, pins, node)}`, ...dc, ...(wave ? [waveWords(wave)] : [])].join(' ')];
    },
  };
}
