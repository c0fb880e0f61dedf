import type { NetlistPart } from '@/lib/netlist/netlist';
import { pinPlaceOf, pinPlacesOf } from '../geometry/pin-place';
import type { Turn } from '../geometry/turn';
import type { PartRecord } from '../records';
import { sourceKinds, type Potential } from './potential';

const turns: readonly Turn[] = [0, 90, 180, 270];

/** Height of a net on the sheet: rails 0, then falling, 0 V at the bottom. Nets that no rail feeds stand between. */
function heightOf(net: string, potential: Potential): number {
  if (net === '0') return 1_000;
  return potential.fall.get(net) ?? (potential.returns.has(net) ? 900 : 500 - (potential.signal.get(net) ?? 0));
}

/** Turn that brings a pin of a two-pin part to the top or to the right. */
export function turnedFor(record: PartRecord, pin: string, where: 'top' | 'right'): Turn {
  return turns.find((turn) => {
    const { out } = pinPlaceOf({ ...record, turn }, pin) ?? { out: { x: 0, y: 0 } };
    return where === 'top' ? out.y < 0 : out.x > 0;
  }) ?? record.turn;
}

/**
 * How a part is turned that belongs to no stage: in line with a rail it lies level, between two potentials it stands with
 * the higher one on top. Sources stand as they are drawn, with 0 V at the bottom. Parts of more pins stay as drawn.
 */
export function orient(part: NetlistPart, record: PartRecord, potential: Potential): Turn {
  const [first, second] = pinPlacesOf(record);
  if (Object.keys(part.pins).length !== 2 || !first || !second) return record.turn;
  const a = part.pins[first.pin] ?? '';
  const b = part.pins[second.pin] ?? '';
  if (sourceKinds.has(part.kind) || part.kind === 'signal-generator') return a === '0' ? 180 : 0;
  if (potential.fall.get(a) === 0 && potential.fall.get(b) === 0) return turnedFor(record, second.pin, 'right');
  return turnedFor(record, heightOf(a, potential) <= heightOf(b, potential) ? first.pin : second.pin, 'top');
}
