import { kindRegistry } from '@/lib/netlist/kinds/kind-registry';
import type { PinDefinition } from '@/lib/netlist/kinds/kind';
import { gridUnit, type PartRecord } from '../records';
import type { Box } from './point';

const boxHalfWidth = 50;

/** Half height of a box with `count` pins: its left column holds the first half, the right column the rest. */
export const boxHalfHeight = (count: number): number => Math.max(2, Math.ceil(count / 2)) * gridUnit;

/** Pins of a boxed part, in the order of its deck line: down the left side, then down the right one. */
export function boxPinPlaces(names: readonly string[]): readonly PinDefinition[] {
  const left = Math.ceil(names.length / 2);
  const top = (rows: number) => -(rows - 1) * gridUnit;
  return names.map((name, index) => index < left
    ? { name, x: -boxHalfWidth, y: top(left) + index * 2 * gridUnit }
    : { name, x: boxHalfWidth, y: top(names.length - left) + (index - left) * 2 * gridUnit });
}

/** Pins of a part about its origin, before mirroring and turning. */
export function pinDefinitionsOf(part: Pick<PartRecord, 'kind' | 'boxPins'>): readonly PinDefinition[] {
  return part.kind === 'box' ? boxPinPlaces(part.boxPins ?? []) : kindRegistry[part.kind].pins;
}

/** Outline of the symbol about its origin, before mirroring and turning. */
export function symbolBoxOf(part: Pick<PartRecord, 'kind' | 'boxPins'>): Box {
  if (part.kind === 'box') {
    const half = boxHalfHeight(part.boxPins?.length ?? 0);
    return { left: -boxHalfWidth, top: -half, right: boxHalfWidth, bottom: half };
  }
  const [left, top, right, bottom] = kindRegistry[part.kind].symbol.box;
  return { left, top, right, bottom };
}
