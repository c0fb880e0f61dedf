import type { LadderFlag } from '@/components/ladder/ladder-state';
import type { MarginEntry } from './margin-entry';

/** Flags of the ladder: at each hold point from which stops block, their numbers in the margin. */
export function stopFlags(entries: readonly MarginEntry[], plan: readonly { readonly name: string }[]): readonly LadderFlag[] {
  const numbers = new Map<string, number[]>();
  for (const entry of entries) {
    if (entry.kind !== 'stop') continue;
    const at = entry.finding.holdPoint ?? plan[0]?.name;
    if (at === undefined) continue;
    numbers.set(at, [...(numbers.get(at) ?? []), entry.number]);
  }
  return plan.flatMap((point) => {
    const here = numbers.get(point.name);
    return here ? [{ holdPoint: point.name, numbers: here }] : [];
  });
}
