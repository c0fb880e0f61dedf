interface Wanted {
  readonly key: string;
  /** Where the entry would like its rule to be, px from the column's top; null for entries without a place on the sheet. */
  readonly y: number | null;
  readonly height: number;
}

export interface ColumnLayout {
  /** Top of each entry, px. */
  readonly tops: ReadonlyMap<string, number>;
  /** Height that all entries take; more than the room means that the column scrolls. */
  readonly total: number;
}

/** Distance from an entry's top to its rule, where the leader leaves. */
export const ruleOffset = 25;

/**
 * Stacks entries in the height order of what they concern. Each stands level with its target where it can; one that is
 * pushed down by others keeps its order; the last ones move up again rather than leave the room. Entries without a place
 * come last.
 */
export function layOutColumn(wanted: readonly Wanted[], room: number, gap = 6): ColumnLayout {
  const ordered = [...wanted].sort((a, b) => (a.y ?? Infinity) - (b.y ?? Infinity) || (a.key < b.key ? -1 : 1));
  const total = ordered.reduce((sum, entry) => sum + entry.height, 0) + gap * Math.max(0, ordered.length - 1);
  const tops: number[] = [];
  let free = 0;
  for (const entry of ordered) {
    const top = Math.max(free, entry.y === null ? free : entry.y - ruleOffset);
    tops.push(top);
    free = top + entry.height + gap;
  }
  let below = Math.max(room, total);
  for (let index = ordered.length - 1; index >= 0; index -= 1) {
    const entry = ordered[index];
    const top = tops[index];
    if (!entry || top === undefined) continue;
    const highest = below - entry.height;
    tops[index] = Math.max(0, Math.min(top, highest));
    below = (tops[index] ?? 0) - gap;
  }
  return { tops: new Map(ordered.map((entry, index) => [entry.key, tops[index] ?? 0])), total };
}
