import type { PartRecord } from '../records';
import { pinDefinitionsOf, symbolBoxOf } from './kind-shape';
import type { Box, Point } from './point';
import { placed, posed } from './turn';

/** A pin as it stands on the sheet. */
export interface PinPlace extends Point {
  readonly part: string;
  readonly pin: string;
  /** Unit vector pointing away from the body: where a wire leaves. */
  readonly out: Point;
}

/** Which way a wire leaves a pin: the side of the symbol's outline nearest to it; at a corner the side that is farther from the origin. */
function outward(pin: Point, box: Box): Point {
  const level: readonly (readonly [number, Point])[] = [[pin.x - box.left, { x: -1, y: 0 }], [box.right - pin.x, { x: 1, y: 0 }]];
  const upright: readonly (readonly [number, Point])[] = [[pin.y - box.top, { x: 0, y: -1 }], [box.bottom - pin.y, { x: 0, y: 1 }]];
  const sides = Math.abs(pin.y) > Math.abs(pin.x) ? [...upright, ...level] : [...level, ...upright];
  return sides.reduce((best, side) => (side[0] < best[0] ? side : best))[1];
}

const cache = new WeakMap<PartRecord, readonly PinPlace[]>();

/** Every pin of a part with its place on the sheet, in the kind's order. Records are immutable, so the answer is kept. */
export function pinPlacesOf(part: PartRecord): readonly PinPlace[] {
  const known = cache.get(part);
  if (known) return known;
  const box = symbolBoxOf(part);
  const places = pinDefinitionsOf(part).map((pin) => ({
    part: part.id, pin: pin.name, ...placed(pin, part), out: posed(outward(pin, box), part),
  }));
  cache.set(part, places);
  return places;
}

export function pinPlaceOf(part: PartRecord, pin: string): PinPlace | undefined {
  return pinPlacesOf(part).find((place) => place.pin === pin);
}

/** Outline of the symbol on the sheet, without its printed words. */
export function partBoxOf(part: PartRecord): Box {
  const box = symbolBoxOf(part);
  const a = placed({ x: box.left, y: box.top }, part);
  const b = placed({ x: box.right, y: box.bottom }, part);
  return { left: Math.min(a.x, b.x), top: Math.min(a.y, b.y), right: Math.max(a.x, b.x), bottom: Math.max(a.y, b.y) };
}
