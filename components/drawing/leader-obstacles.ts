import type { Obstacles } from '@/components/margin/sheet-geometry';
import { partBoxOf } from '@/lib/document/geometry/pin-place';
import { indexOf } from '@/lib/document/geometry/sheet-index';
import { wirePath } from '@/lib/document/geometry/wire-path';
import type { Sheet } from '@/lib/document/records';

/** Symbols within their outlines, where leaders may end, and the room just above and below level wires; in sheet units. */
export function obstaclesOf(sheet: Sheet): Obstacles {
  const index = indexOf(sheet);
  const symbols = sheet.parts.filter((part) => part.kind !== 'net-name').map(partBoxOf).map((box) => ({ left: box.left + 2, top: box.top + 2, right: box.right - 2, bottom: box.bottom - 2 }));
  const levelWires = sheet.wires.flatMap((wire) => {
    const path = wirePath(index, wire);
    return path.slice(1).flatMap((b, at) => {
      const a = path[at] ?? b;
      return a.y === b.y && Math.abs(a.x - b.x) > 20 ? [{ left: Math.min(a.x, b.x), top: a.y - 5, right: Math.max(a.x, b.x), bottom: a.y + 5 }] : [];
    });
  });
  return { symbols, levelWires };
}
