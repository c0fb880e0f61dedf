import type { Box, Point } from '@/lib/document/geometry/point';

/** A sheet's frame is divided into numbered columns and lettered rows, as drawing sheets are (ISO 5457). */
export const zoneColumns = 6;
export const zoneRows = 4;

/** Zone of a point in the frame, 'B5'; points outside count to the nearest. */
export function zoneOf(point: Point, frame: Box): string {
  const at = (value: number, from: number, to: number, count: number) => Math.min(count - 1, Math.max(0, Math.floor(((value - from) / (to - from)) * count)));
  return `${String.fromCharCode(65 + at(point.y, frame.top, frame.bottom, zoneRows))}${at(point.x, frame.left, frame.right, zoneColumns) + 1}`;
}
