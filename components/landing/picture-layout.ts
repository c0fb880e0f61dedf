import { drawingBounds } from '@/components/drawing/drawing-bounds';
import { ReadingGeometry, type View } from '@/components/drawing/reading-geometry';
import { layOutColumn } from '@/components/margin/column-layout';
import { routeLeaders, settleTops } from '@/components/margin/leaders';
import type { DrawnLeader } from '@/components/margin/leader-lines';
import type { FindingEntry } from '@/components/margin/margin-entry';
import { splitMessage } from '@/components/margin/finding-words';
import type { Sheet } from '@/lib/document/records';

/** Sizes of the picture in px. */
export const pictureSize = { drawing: 448, margin: 330, height: 436 } as const;

/** The part of the demo drawing that the picture shows: the switch, its coil, its gate and its indicator. */
export const pictureView: View = { x: 545, y: 62, scale: 0.9 };

/** Height of an entry with its words, at the picture's width: about 50 letters a line of 18 px. */
function heightOf(entry: FindingEntry): number {
  const { head, rest } = splitMessage(entry.finding.message);
  const lines = (text: string) => (text === '' ? 0 : Math.ceil(text.length / 50));
  return 36 + lines(head) * 19 + lines(rest) * 18 + lines(entry.finding.remedy?.words ?? '') * 18;
}

export interface PlacedEntry {
  readonly entry: FindingEntry;
  readonly top: number;
}

/** Entries at the height of what they concern, with leaders, worked out once: nothing of it runs in the browser. */
export function layOutPicture(sheet: Sheet, entries: readonly FindingEntry[]): { readonly placed: readonly PlacedEntry[]; readonly leaders: readonly DrawnLeader[] } {
  const extent = { width: pictureSize.drawing, height: pictureSize.height };
  const geometry = new ReadingGeometry(sheet, drawingBounds(sheet), pictureView, extent, () => undefined);
  const targets = new Map(entries.flatMap((entry) => {
    const target = entry.anchor === null ? null : geometry.targetOf(entry.anchor);
    return target ? [[entry.key, target] as const] : [];
  }));
  const column = layOutColumn(entries.map((entry) => ({ key: entry.key, y: targets.get(entry.key)?.ends[0]?.y ?? null, height: heightOf(entry) })), pictureSize.height, 10);
  const view = { of: targets, texts: geometry.texts(), obstacles: geometry.obstacles(), ...extent };
  const stacked = entries.map((entry) => ({ key: entry.key, top: column.tops.get(entry.key) ?? 0, height: heightOf(entry) })).sort((a, b) => a.top - b.top);
  const tops = settleTops(stacked, view, 0, pictureSize.height, 10);
  const placed = entries.map((entry) => ({ entry, top: tops.get(entry.key) ?? 0 })).filter(({ entry, top }) => top + heightOf(entry) <= pictureSize.height + 8).sort((a, b) => a.top - b.top);
  const leaders = routeLeaders(placed.map(({ entry, top }) => ({ key: entry.key, kind: entry.kind, on: false, top })), view, 0);
  return { placed, leaders };
}
