import { ruleOffset } from './column-layout';
import { routeLeader, type Leader } from './leader-route';
import type { DrawnLeader } from './leader-lines';
import type { EntryKind } from './margin-entry';
import type { Targets } from './use-targets';

interface LeaderWanted {
  readonly key: string;
  readonly kind: EntryKind;
  readonly on: boolean;
  /** Top of the entry, px from the canvas's top. */
  readonly top: number;
}

/** Leaders of all entries that are in view at both ends, from the top down, so that later ones avoid earlier ones. */
export function routeLeaders(wanted: readonly LeaderWanted[], targets: Targets, columnTop: number): readonly DrawnLeader[] {
  const routed: DrawnLeader[] = [];
  const level: Leader[] = [];
  for (const entry of [...wanted].sort((a, b) => a.top - b.top)) {
    const target = targets.of.get(entry.key);
    const y = entry.top + ruleOffset + 0.5;
    if (!target || y < columnTop || y > targets.height) continue;
    const ends = target.ends.filter((end) => end.x >= 0 && end.x <= targets.width && end.y >= 0 && end.y <= targets.height);
    const leader = routeLeader({ x: targets.width, y }, ends, targets.texts, level);
    if (!leader) continue;
    level.push(leader);
    routed.push({ ...leader, from: { x: targets.width + 12, y }, key: entry.key, kind: entry.kind, on: entry.on });
  }
  return routed;
}
