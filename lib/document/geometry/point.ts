import { gridUnit } from '../records';

/** A place on the sheet, sheet units, y downwards. */
export interface Point {
  readonly x: number;
  readonly y: number;
}

/** Left, top, right, bottom in sheet units. */
export interface Box {
  readonly left: number;
  readonly top: number;
  readonly right: number;
  readonly bottom: number;
}

export const pointKey = (point: Point): string => `${point.x},${point.y}`;

export const samePoint = (a: Point, b: Point): boolean => a.x === b.x && a.y === b.y;

export const snap = (value: number): number => Math.round(value / gridUnit) * gridUnit + 0;

export const snapPoint = (point: Point): Point => ({ x: snap(point.x), y: snap(point.y) });

export function boxesOverlap(a: Box, b: Box): boolean {
  return a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom;
}

export function boxHolds(box: Box, point: Point): boolean {
  return point.x >= box.left && point.x <= box.right && point.y >= box.top && point.y <= box.bottom;
}

export function joinBoxes(boxes: readonly Box[]): Box | null {
  if (boxes.length === 0) return null;
  return {
    left: Math.min(...boxes.map((box) => box.left)),
    top: Math.min(...boxes.map((box) => box.top)),
    right: Math.max(...boxes.map((box) => box.right)),
    bottom: Math.max(...boxes.map((box) => box.bottom)),
  };
}

export const growBox = (box: Box, by: number): Box => ({
  left: box.left - by, top: box.top - by, right: box.right + by, bottom: box.bottom + by,
});

/** True when `point` lies on the straight, axis-aligned segment from `a` to `b`, ends included. */
export function onSegment(point: Point, a: Point, b: Point): boolean {
  if (a.x === b.x) return point.x === a.x && point.y >= Math.min(a.y, b.y) && point.y <= Math.max(a.y, b.y);
  if (a.y === b.y) return point.y === a.y && point.x >= Math.min(a.x, b.x) && point.x <= Math.max(a.x, b.x);
  return false;
}
