import type { Box as ScreenBox, MarginAnchor, Obstacles, SheetGeometry, SheetTarget } from '@/components/margin/sheet-geometry';
import type { Box, Point } from '@/lib/document/geometry/point';
import type { Sheet } from '@/lib/document/records';
import { netNameBox, placeLabels } from './label-places';
import { leaderEnds } from './leader-ends';
import { obstaclesOf } from './leader-obstacles';
import { zoneOf } from './zones';

/** What part of the sheet is on the screen: sheet units of its left top, and pixels a unit. */
export interface View {
  readonly x: number;
  readonly y: number;
  readonly scale: number;
}

/** Answers the margin's questions about a drawing. View and drawing may change under it: the margin keeps one for the canvas's life. */
export class ReadingGeometry implements SheetGeometry {
  private readonly listeners = new Set<() => void>();
  private labels: readonly Box[] | null = null;
  private kept: Obstacles | null = null;

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
    [this.sheet, this.frame, this.labels, this.kept] = [sheet, frame, null, null];
    for (const listener of this.listeners) listener();
  }

  /** Tells the margin that the picture moved. */
  moved(view: View, extent: { readonly width: number; readonly height: number }): void {
    this.view = view;
    this.extent = extent;
    for (const listener of this.listeners) listener();
  }

  targetOf(anchor: MarginAnchor): SheetTarget | null {
    const found = leaderEnds(this.sheet, anchor);
    const [first] = found?.ends ?? [];
    if (!found || !first) return null;
    const zone = zoneOf(first, this.frame);
    return { ends: found.ends.map((end) => this.screen(end)), zone, words: found.words || zone };
  }

  texts(): readonly ScreenBox[] {
    this.labels ??= [...placeLabels(this.sheet).map((label) => label.box), ...this.sheet.parts.filter((part) => part.kind === 'net-name').map(netNameBox)];
    return this.labels.map((box) => this.onScreen(box));
  }

  obstacles(): Obstacles {
    this.kept ??= obstaclesOf(this.sheet);
    return { symbols: this.kept.symbols.map((box) => this.onScreen(box)), levelWires: this.kept.levelWires.map((box) => this.onScreen(box)) };
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
    const [end] = leaderEnds(this.sheet, anchor)?.ends ?? [];
    if (end) this.onReveal(end);
  }

  private onScreen(box: Box): ScreenBox {
    const a = this.screen({ x: box.left, y: box.top });
    const b = this.screen({ x: box.right, y: box.bottom });
    return { left: a.x, top: a.y, right: b.x, bottom: b.y };
  }

  private screen(point: Point): Point {
    return { x: (point.x - this.view.x) * this.view.scale, y: (point.y - this.view.y) * this.view.scale };
  }
}
