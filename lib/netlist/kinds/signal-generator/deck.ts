import type { NetlistPart, Wave } from '../../netlist';
import { numberOf } from '../element-line';
import { voltageSourceDeck } from '../source-line';

/** Edges where the sheet gives none, seconds (`docs/engine.md` 2.3); a fiftieth of the period where that is shorter. */
const edgeSeconds = 10e-9;

/** Square wave from low to high at the switching frequency, half of the time high unless a duty is given. */
function squareOf(part: NetlistPart): Wave | undefined {
  const [low, high, hertz] = [numberOf(part, 'low') ?? 0, numberOf(part, 'high'), numberOf(part, 'fsw')];
  if (high === undefined || hertz === undefined || hertz <= 0) return undefined;
  const period = 1 / hertz;
  const edge = Math.min(edgeSeconds, period / 50);
  const width = Math.max(period * ((numberOf(part, 'duty') ?? 50) / 100) - edge, 0);
  return { shape: 'pulse', args: [low, high, 0, edge, edge, width, period] };
}

/** Set levels of the generator, open circuit; its source resistance stands in the fact line. */
export const signalGeneratorDeck = voltageSourceDeck(
  ['+', '-'], squareOf, (element) => element.letter === 'V' && element.wave !== undefined,
);
