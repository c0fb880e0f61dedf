import { ruleOffset } from './column-layout';
import { routeLeader, type Leader } from './leader-route';
import type { DrawnLeader } from './leader-lines';
import type { EntryKind } from './margin-entry';
import type { Place } from './sheet-geometry';
import type { Targets } from './use-targets';

interface LeaderWanted {
  readonly key: string;
  readonly kind: EntryKind;
  readonly on: boolean;
  /** Top of the entry, px from the canvas's top. */
  readonly top: number;
}

function visibleEnds(targets: Targets, key: string): readonly Place[] {
  return targets.of.get(key)?.ends.filter((end) => end.x >= 0 && end.x <= targets.width && end.y >= 0 && end.y <= targets.height) ?? [];
}

/** Leaders of all entries that are in view at both ends, from the top down, so that later ones avoid earlier ones. */
export function routeLeaders(wanted: readonly LeaderWanted[], targets: Targets, columnTop: number): readonly DrawnLeader[] {
  const routed: DrawnLeader[] = [];
  const level: Leader[] = [];
  for (const entry of [...wanted].sort((a, b) => a.top - b.top)) {
    const y = entry.top + ruleOffset + 0.5;
    if (y < columnTop || y > targets.height) continue;
    const leader = routeLeader({ x: targets.width, y }, visibleEnds(targets, entry.key), targets.texts, level, targets.obstacles)?.leader;
    if (!leader) continue;
    level.push(leader);
    routed.push({ ...leader, from: { x: targets.width + 12, y }, key: entry.key, kind: entry.kind, on: entry.on });
  }
  return routed;
}

interface Standing {
  readonly key: string;
  readonly top: number;
  readonly height: number;
}

/** How far an entry may leave its level to spare a text, px, nearest first. */
const shifts = [0, -14, 14, -28, 28, -44, 44, -64, 64, 90, 120];

/** An entry leaves its level this many times at most to spare a symbol or a wire; a text weighs more than all of those. */
const shiftsForObstacles = 5;
const aText = 1_000;

/**
 * Moves entries a little up or down, and those below on where there is room, so that their leaders cross no text and, where
 * that is near, no symbol. Order and least distances stay. `columnTop` is where the column begins on the canvas.
 */
export function settleTops(entries: readonly Standing[], targets: Targets, columnTop: number, room: number, gap = 6): ReadonlyMap<string, number> {
  const tops = new Map<string, number>();
  let free = 0;
  let following = entries.reduce((sum, entry) => sum + entry.height, 0) + gap * Math.max(0, entries.length - 1);
  for (const [index, { key, top, height }] of entries.entries()) {
    following -= height + (index === 0 ? 0 : gap);
    const highest = Math.max(free, top, room - following - height);
    // An entry below the canvas has no leader: nothing to spare.
    const ends = columnTop + Math.max(free, top) > targets.height ? [] : visibleEnds(targets, key);
    let best = { top: Math.max(free, top), burden: Infinity };
    for (const [tries, shift] of (ends.length === 0 ? [0] : shifts).entries()) {
      if (tries >= shiftsForObstacles && best.burden < aText) break;
      const tried = Math.min(highest, Math.max(free, top + shift));
      const routed = routeLeader({ x: targets.width, y: columnTop + tried + ruleOffset + 0.5 }, ends, targets.texts, [], targets.obstacles);
      const burden = (routed?.texts ?? 0) * aText + (routed?.obstacles ?? 0);
      if (burden < best.burden) best = { top: tried, burden };
      if (best.burden === 0) break;
    }
    tops.set(key, best.top);
    free = best.top + height + gap;
  }
  return tops;
}
