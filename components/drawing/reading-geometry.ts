import type { Box as ScreenBox, MarginAnchor, SheetGeometry, SheetTarget } from '@/components/margin/sheet-geometry';
import { partBoxOf, pinPlacesOf } from '@/lib/document/geometry/pin-place';
import type { Box, Point } from '@/lib/document/geometry/point';
import { indexOf } from '@/lib/document/geometry/sheet-index';
import { wirePath } from '@/lib/document/geometry/wire-path';
import type { PartRecord, Sheet } from '@/lib/document/records';
import { netOfLines } from './hot-wires';
import { netNameBox, placeLabels } from './label-places';
import { zoneOf } from './zones';

/** What part of the sheet is on the screen: sheet units of its left top, and pixels a unit. */
export interface View {
  readonly x: number;
  readonly y: number;
  readonly scale: number;
}

/** Places on a symbol's outline and leads where a leader may end, the best first; several, so that one is clear of words. */
function endsOfPart(part: PartRecord): readonly Point[] {
  const box = partBoxOf(part);
  const middle = (box.top + box.bottom) / 2;
  const centre = (box.left + box.right) / 2;
  const pins = pinPlacesOf(part);
  if (pins.length === 1) return [{ x: box.right, y: middle }, { x: centre, y: box.top }, { x: box.left, y: middle }, { x: part.x, y: part.y }];
  if (pins.length > 0 && pins.every((pin) => pin.out.y !== 0)) {
    const lead = (box.bottom - box.top) / 2 - 9;
    return [
      { x: box.right, y: middle }, { x: centre, y: middle + lead }, { x: centre, y: middle - lead },
      { x: box.left, y: middle }, { x: box.right, y: middle + 8 }, { x: box.right, y: middle - 8 },
    ];
  }
  if (pins.length > 0 && pins.every((pin) => pin.out.x !== 0)) {
    const lead = (box.right - box.left) / 2 - 8;
    return [{ x: centre, y: box.bottom }, { x: centre, y: box.top }, { x: centre + lead, y: middle }, { x: centre - lead, y: middle }];
  }
  return [{ x: box.right, y: middle }, ...pins.map((pin) => ({ x: pin.x - pin.out.x * 8, y: pin.y - pin.out.y * 8 }))];
}

function endsOfNet(sheet: Sheet, name: string): readonly Point[] {
  const index = indexOf(sheet);
  const nets = netOfLines(sheet);
  const paths = sheet.wires.filter((wire) => nets.get(wire.id) === name).map((wire) => wirePath(index, wire));
  const middles = paths.flatMap((path) => path.slice(1).map((b, at) => ({ x: (b.x + (path[at]?.x ?? b.x)) / 2, y: (b.y + (path[at]?.y ?? b.y)) / 2 })));
  return middles.sort((a, b) => b.x - a.x).slice(0, 6);
}

function find(sheet: Sheet, anchor: MarginAnchor): { readonly ends: readonly Point[]; readonly words: string } | null {
  switch (anchor.kind) {
    case 'spot': return { ends: [{ x: anchor.x, y: anchor.y }], words: '' };
    case 'net': {
      const ends = endsOfNet(sheet, anchor.name);
      return ends.length === 0 ? null : { ends, words: `net ${anchor.name}` };
    }
    default: {
      const part = sheet.parts.find((one) => (anchor.kind === 'part' ? one.id === anchor.id : one.ref === anchor.ref));
      return part ? { ends: endsOfPart(part), words: part.ref || 'a mark' } : null;
    }
  }
}

/** Answers the margin's questions about a drawing. View and drawing may change under it: the margin keeps one for the canvas's life. */
export class ReadingGeometry implements SheetGeometry {
  private readonly listeners = new Set<() => void>();
  private labels: readonly Box[] | null = null;

  constructor(
    private sheet: Sheet,
    private frame: Box,
    private view: View,
    private extent: { readonly width: number; readonly height: number },
    private readonly onReveal: (point: Point) => void,
  ) {}

  /** Tells the margin that another drawing stands here: an edit, or a drag in progress. */
  drawn(sheet: Sheet, frame: Box): void {
    if (sheet === this.sheet && frame === this.frame) return;
    [this.sheet, this.frame, this.labels] = [sheet, frame, null];
    for (const listener of this.listeners) listener();
  }

  /** Tells the margin that the picture moved. */
  moved(view: View, extent: { readonly width: number; readonly height: number }): void {
    this.view = view;
    this.extent = extent;
    for (const listener of this.listeners) listener();
  }

  targetOf(anchor: MarginAnchor): SheetTarget | null {
    const found = find(this.sheet, anchor);
    const [first] = found?.ends ?? [];
    if (!found || !first) return null;
    const zone = zoneOf(first, this.frame);
    return { ends: found.ends.map((end) => this.screen(end)), zone, words: found.words || zone };
  }

  texts(): readonly ScreenBox[] {
    this.labels ??= [...placeLabels(this.sheet).map((label) => label.box), ...this.sheet.parts.filter((part) => part.kind === 'net-name').map(netNameBox)];
    return this.labels.map((box) => {
      const a = this.screen({ x: box.left, y: box.top });
      const b = this.screen({ x: box.right, y: box.bottom });
      return { left: a.x, top: a.y, right: b.x, bottom: b.y };
    });
  }

  size = () => this.extent;

  subscribe(listener: () => void): () => void {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  }

  spotInView(): Point {
    const { x, y, scale } = this.view;
    return { x: Math.round(x + this.extent.width / scale / 2), y: Math.round(y + this.extent.height / scale / 2) };
  }

  reveal(anchor: MarginAnchor): void {
    const [end] = find(this.sheet, anchor)?.ends ?? [];
    if (end) this.onReveal(end);
  }

  private screen(point: Point): Point {
    return { x: (point.x - this.view.x) * this.view.scale, y: (point.y - this.view.y) * this.view.scale };
  }
}
