import { samePoint, type Point } from '@/lib/document/geometry/point';
import type { Sheet, WireRecord } from '@/lib/document/records';
import type { NewId } from './edit';
import { tidyWiring } from './tidy-wiring';
import { makeEndAt } from './wire-target';

/**
 * Draws a wire between two places. A place on a pin or junction joins it, one on another wire joins that by a new
 * junction, any other is a loose end. The sheet itself when the wire would have no length.
 */
export function addWire(sheet: Sheet, from: Point, bends: WireRecord['bends'], to: Point, newId: NewId): Sheet {
  if (samePoint(from, to)) return sheet;
  const start = makeEndAt(sheet, from, newId);
  const finish = makeEndAt(start.sheet, to, newId);
  const wire: WireRecord = { id: newId(), a: start.end, b: finish.end, bends };
  return tidyWiring({ ...finish.sheet, wires: [...finish.sheet.wires, wire] });
}
