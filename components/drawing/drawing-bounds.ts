import { partBoxOf } from '@/lib/document/geometry/pin-place';
import { growBox, joinBoxes, type Box } from '@/lib/document/geometry/point';
import { indexOf } from '@/lib/document/geometry/sheet-index';
import { wirePath } from '@/lib/document/geometry/wire-path';
import type { Sheet } from '@/lib/document/records';
import { placeLabels } from './label-places';

/** Everything that is drawn, words included, with a margin round it; a plain field when the sheet is empty. */
export function drawingBounds(sheet: Sheet, margin = 40): Box {
  const index = indexOf(sheet);
  const points = sheet.wires.flatMap((wire) => wirePath(index, wire)).map((point) => ({ left: point.x, top: point.y, right: point.x, bottom: point.y }));
  const all = joinBoxes([...sheet.parts.map(partBoxOf), ...placeLabels(sheet).map((label) => label.box), ...points]);
  return all ? growBox(all, margin) : { left: 0, top: 0, right: 860, bottom: 610 };
}
