import { snap, type Point } from '../geometry/point';
import type { Block } from './block';
import { farFrom, layeredLayout, type Layout } from './layered-layout';
import type { Potential } from './potential';

/** Most blocks laid out as one drawing; more of them would make layers too wide to read. */
const areaSize = 40;
const gap = 60;

/**
 * Blocks that nets join in groups of a readable size: each connected circuit by itself, a large one cut along the way
 * from its first part. Nets with very many pins (rails) do not count as joining.
 */
export function areasOf(blocks: readonly Block[]): readonly (readonly Block[])[] {
  const onNet = new Map<string, Block[]>();
  const netsOf = (block: Block) => [...new Set(block.members.flatMap(({ part }) => Object.values(part.pins)))].filter((net) => net !== '0');
  for (const block of blocks) for (const net of netsOf(block)) onNet.set(net, [...(onNet.get(net) ?? []), block]);
  const seen = new Set<string>();
  const areas: Block[][] = [];
  for (const start of blocks) {
    if (seen.has(start.id)) continue;
    let area: Block[] = [];
    areas.push(area);
    const queue = [start];
    seen.add(start.id);
    for (let block = queue.shift(); block; block = queue.shift()) {
      if (area.length >= areaSize) {
        area = [];
        areas.push(area);
      }
      area.push(block);
      for (const net of netsOf(block)) {
        const near = onNet.get(net) ?? [];
        if (near.length > farFrom) continue;
        for (const next of near) {
          if (seen.has(next.id)) continue;
          seen.add(next.id);
          queue.push(next);
        }
      }
    }
  }
  return areas;
}

/** Places for all blocks: each area laid out by itself, areas set in rows of about the sheet's proportions. */
export async function areasLayout(blocks: readonly Block[], potential: Potential): Promise<ReadonlyMap<string, Point>> {
  const layouts: Layout[] = [];
  for (const area of areasOf(blocks)) layouts.push(await layeredLayout(area, potential));
  const surface = layouts.reduce((sum, layout) => sum + (layout.width + gap) * (layout.height + gap), 0);
  const rowWidth = Math.max(1_200, Math.sqrt(surface * 1.6), ...layouts.map((layout) => layout.width));
  const places = new Map<string, Point>();
  let [left, top, rowHeight] = [0, 0, 0];
  for (const layout of layouts) {
    if (left > 0 && left + layout.width > rowWidth) {
      [left, top, rowHeight] = [0, top + rowHeight + gap, 0];
    }
    for (const [id, place] of layout.places) places.set(id, { x: place.x + snap(left), y: place.y + snap(top) });
    left += layout.width + gap;
    rowHeight = Math.max(rowHeight, layout.height);
  }
  return places;
}
