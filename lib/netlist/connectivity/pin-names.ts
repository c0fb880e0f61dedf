import { kindOf } from '../kinds/kind-registry';
import type { DrawnPart } from './netlist-source';

/** Pins of a part in the order of its kind, those of a box in its own. */
export function pinNames(part: Pick<DrawnPart, 'kind' | 'boxPins'>): readonly string[] {
  return part.kind === 'box' ? (part.boxPins ?? []) : kindOf(part.kind).pins.map((pin) => pin.name);
}
