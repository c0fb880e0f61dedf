import { partBoxOf, pinPlacesOf, type PinPlace } from '@/lib/document/geometry/pin-place';
import { boxesOverlap, growBox, type Box } from '@/lib/document/geometry/point';
import { gridUnit, type PartRecord, type Sheet } from '@/lib/document/records';

/** Room that the words of a part usually take, sheet units: a designator and two values. */
const words = { width: 60, height: 42 };
/** Length of the 0 V symbol that goes under the part. */
const zeroSymbol = 30;
/** Lengths of the wire from the pin down to the part, the best first. */
const drops = [20, 30, 40, 60, 80];
/** How far aside of the pin, the best first. */
const asides = [0, -20, 20, -40, 40, -60, 60, -80, 80, -100, 100, -120, 120];

const besides = (box: Box, side: 'left' | 'right'): Box => {
  const middle = (box.top + box.bottom) / 2;
  const [left, right] = side === 'right' ? [box.right, box.right + words.width] : [box.left - words.width, box.left];
  return { left, right, top: middle - words.height / 2, bottom: middle + words.height / 2 };
};

/** Where the words of a part stand when nothing is in their way: beside an upright symbol, above a level one. */
function usualWords(part: PartRecord): readonly Box[] {
  const pins = pinPlacesOf(part);
  if (part.ref === '' || pins.length < 2) return [];
  const box = partBoxOf(part);
  if (pins.length > 2 || pins.every((pin) => pin.out.y !== 0)) return [besides(box, 'right')];
  const middle = (box.left + box.right) / 2;
  return [{ left: middle - words.width / 2, right: middle + words.width / 2, top: box.top - words.height, bottom: box.top }];
}

/**
 * Where an upright part hangs under one of `anchors` with 0 V below it: a straight wire down where there is room, with a side
 * free for its words, and on nobody else's symbol, wire or words. `top` is its upper pin, from its origin. Null without room.
 */
export function hangPlace(sheet: Sheet, part: PartRecord, top: { readonly x: number; readonly y: number }, anchors: readonly PinPlace[], wires: readonly Box[]): PartRecord | null {
  const bodies = sheet.parts.map((one) => growBox(partBoxOf(one), gridUnit / 2));
  const taken = [...bodies, ...wires, ...sheet.parts.flatMap(usualWords)];
  const clear = (box: Box) => !taken.some((other) => boxesOverlap(other, box));
  let best: { readonly record: PartRecord; readonly cost: number } | null = null;
  for (const [rank, anchor] of anchors.entries()) for (const aside of asides) for (const drop of drops) {
    const cost = Math.abs(aside) * 2 + drop + rank * 15;
    if (best !== null && cost >= best.cost) continue;
    const record = { ...part, x: anchor.x + aside - top.x, y: anchor.y + drop - top.y };
    const body = partBoxOf(record);
    const whole = { ...growBox(body, gridUnit / 2), top: body.top, bottom: body.bottom + zeroSymbol };
    if (clear(whole) && (clear(besides(body, 'right')) || clear(besides(body, 'left')))) best = { record, cost };
  }
  return best?.record ?? null;
}
