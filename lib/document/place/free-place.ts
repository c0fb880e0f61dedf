import { partBoxOf } from '../geometry/pin-place';
import { boxesOverlap, growBox, type Box } from '../geometry/point';
import { gridUnit, type PartRecord } from '../records';

/** The nearest place, ring by ring, at which a part stands clear of other outlines by `room` sheet units. */
export function freePlace(record: PartRecord, outlines: readonly Box[], room = 30): PartRecord {
  const taken = outlines.map((outline) => growBox(outline, room));
  const clear = (candidate: PartRecord) => !taken.some((box) => boxesOverlap(box, partBoxOf(candidate)));
  for (let ring = 0; ring < 200; ring += 1) {
    const reach = ring * 2 * gridUnit;
    const steps = ring === 0 ? 1 : ring * 2;
    for (let step = 0; step <= steps; step += 1) {
      const along = ring === 0 ? 0 : -reach + step * 2 * gridUnit;
      for (const [x, y] of [[along, reach], [reach, along], [along, -reach], [-reach, along]] as const) {
        const candidate = { ...record, x: record.x + x, y: record.y + y };
        if (clear(candidate)) return candidate;
      }
    }
  }
  return record;
}
