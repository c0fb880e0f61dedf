import { partBoxOf, pinPlacesOf } from '@/lib/document/geometry/pin-place';
import { boxesOverlap, type Box, type Point } from '@/lib/document/geometry/point';
import { indexOf } from '@/lib/document/geometry/sheet-index';
import { wirePath } from '@/lib/document/geometry/wire-path';
import type { PartRecord, Sheet } from '@/lib/document/records';
import { Near } from './near';
import { ownWords, partWords } from './part-words';
import { throughMarks } from './through-marks';

export interface PlacedLabel {
  readonly part: string;
  readonly ref: string | null;
  readonly values: readonly string[];
  readonly x: number;
  /** Baseline of the first line. */
  readonly y: number;
  readonly anchor: 'start' | 'middle' | 'end';
  readonly box: Box;
}

export const lineStep = 14;
const ascent = 10;
const letter = 7.2;
const gap = 7;

interface Segment {
  readonly a: Point;
  readonly b: Point;
}

function segmentInBox({ a, b }: Segment, box: Box): boolean {
  return Math.max(a.x, b.x) > box.left && Math.min(a.x, b.x) < box.right && Math.max(a.y, b.y) > box.top && Math.min(a.y, b.y) < box.bottom;
}

/** Box of the symbol's body: the outline without its leads, so that words stand close to it. */
function bodyOf(part: PartRecord): { readonly box: Box; readonly upright: boolean } {
  const box = partBoxOf(part);
  const pins = pinPlacesOf(part);
  const upright = pins.length > 0 && pins.every((pin) => pin.out.y !== 0);
  return { box, upright };
}

function candidates(part: PartRecord, width: number, lines: number): readonly PlacedLabel[] {
  const { box, upright } = bodyOf(part);
  const words = partWords(part);
  const height = lines * lineStep;
  const middleX = (box.left + box.right) / 2;
  const middleY = (box.top + box.bottom) / 2;
  const at = (x: number, top: number, anchor: PlacedLabel['anchor']): PlacedLabel => {
    const left = anchor === 'start' ? x : anchor === 'end' ? x - width : x - width / 2;
    return { part: part.id, ...words, x, y: top + ascent, anchor, box: { left, top, right: left + width, bottom: top + height } };
  };
  const right = at(box.right + gap, middleY - height / 2, 'start');
  const left = at(box.left - gap, middleY - height / 2, 'end');
  const above = at(middleX, box.top - 4 - height, 'middle');
  const below = at(middleX, box.bottom + 4, 'middle');
  const corners = [at(box.right + 3, box.top - height, 'start'), at(box.left - 3, box.top - height, 'end'), at(box.right + 3, box.bottom, 'start'), at(box.left - 3, box.bottom, 'end')];
  return upright || part.kind === 'nmos' || part.kind === 'pmos' || part.kind === 'npn' || part.kind === 'pnp' ? [right, left, ...corners, above, below] : [above, below, ...corners, right, left];
}

const overlap = (box: Box, segment: Segment): number => {
  const across = Math.min(Math.max(segment.a.x, segment.b.x), box.right) - Math.max(Math.min(segment.a.x, segment.b.x), box.left);
  const down = Math.min(Math.max(segment.a.y, segment.b.y), box.bottom) - Math.max(Math.min(segment.a.y, segment.b.y), box.top);
  return Math.max(across, down, 1);
};

const cache = new WeakMap<Sheet, readonly PlacedLabel[]>();

/**
 * Where the words of each part stand: beside an upright symbol, above a level one, moved to another side when wires, symbols or
 * other words are in the way.
 */
export function placeLabels(sheet: Sheet): readonly PlacedLabel[] {
  const known = cache.get(sheet) ?? labelsOf(sheet);
  cache.set(sheet, known);
  return known;
}

function labelsOf(sheet: Sheet): readonly PlacedLabel[] {
  const index = indexOf(sheet);
  const segments = new Near<Segment>();
  for (const wire of sheet.wires) {
    const path = wirePath(index, wire);
    path.slice(1).forEach((b, at) => {
      const a = path[at] ?? b;
      segments.add({ left: Math.min(a.x, b.x), top: Math.min(a.y, b.y), right: Math.max(a.x, b.x), bottom: Math.max(a.y, b.y) }, { a, b });
    });
  }
  const bodies = new Near<{ readonly id: string; readonly box: Box }>();
  for (const part of sheet.parts) {
    const box = partBoxOf(part);
    bodies.add(box, { id: part.id, box });
  }
  const taken = new Near<Box>();
  const through = throughMarks(sheet);
  for (const part of sheet.parts) {
    if (part.kind !== 'net-name') continue;
    const box = through.has(part.id) ? throughBox(part) : netNameBox(part);
    taken.add(box, box);
  }
  const placed: PlacedLabel[] = [];
  for (const part of sheet.parts) {
    const words = partWords(part);
    const lines = [words.ref, ...words.values].filter((line) => line !== null && line !== '');
    if (lines.length === 0) continue;
    const width = Math.max(...lines.map((line) => (line ?? '').length)) * letter;
    let best: { readonly label: PlacedLabel; readonly cost: number } | null = null;
    for (const [rank, label] of candidates(part, width, lines.length).entries()) {
      let cost = rank * 3;
      for (const segment of segments.within(label.box)) if (segmentInBox(segment, label.box)) cost += 20 + overlap(label.box, segment);
      for (const { id, box } of bodies.within(label.box)) if (id !== part.id && boxesOverlap(label.box, box)) cost += 60;
      for (const box of taken.within(label.box)) if (boxesOverlap(label.box, box)) cost += 120;
      if (best === null || cost < best.cost) best = { label, cost };
    }
    if (!best) continue;
    taken.add(best.label.box, best.label.box);
    placed.push(best.label);
  }
  return placed;
}

/** Box of a net name's words beside the line that runs through it. */
function throughBox(part: PartRecord): Box {
  const width = ownWords(part).length * letter;
  const upright = part.turn === 90 || part.turn === 270;
  return upright ? { left: part.x + 6, top: part.y - 7, right: part.x + 7 + width, bottom: part.y + 7 } : { left: part.x - width / 2, top: part.y - 17, right: part.x + width / 2, bottom: part.y - 4 };
}

/** Box of a net name's own words, which stand on the side its mark points to. */
export function netNameBox(part: PartRecord): Box {
  const width = ownWords(part).length * letter;
  const box = partBoxOf(part);
  const leftwards = (part.turn === 180) !== part.mirror;
  return leftwards ? { left: part.x - 14 - width, top: part.y - 7, right: part.x, bottom: part.y + 7 } : { left: Math.min(part.x, box.left), top: part.y - 7, right: part.x + 14 + width, bottom: part.y + 7 };
}
