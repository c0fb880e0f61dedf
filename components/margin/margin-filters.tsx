'use client';
import { FilterChip } from '@/components/ui/filter-chip';
import { Mark } from '@/components/ui/mark';
import type { EntryKind } from './margin-entry';

export type MarginFilter = 'all' | EntryKind;

interface MarginFiltersProps {
  readonly filter: MarginFilter;
  readonly counts: Readonly<Record<EntryKind, number>>;
  readonly onFilter: (filter: MarginFilter) => void;
}

export function MarginFilters({ filter, counts, onFilter }: MarginFiltersProps) {
  const all = Object.values(counts).reduce((sum, count) => sum + count, 0);
  const chip = (kind: EntryKind, words: string, compact = false) => (
    <FilterChip pressed={filter === kind} count={counts[kind]} words={words} compact={compact} mark={<Mark kind={kind} size={14} silent />} onClick={() => onFilter(filter === kind ? 'all' : kind)} />
  );
  return (
    <div role="group" aria-label="Show" className="flex max-w-full gap-[3px] overflow-x-auto max-tablet:gap-1.5">
      <FilterChip pressed={filter === 'all'} count={all} words="All" onClick={() => onFilter('all')} />
      {chip('stop', 'Stop')}
      {chip('caution', 'Caution', true)}
      {chip('advice', 'Advice', true)}
      {chip('note', 'Notes')}
      {counts.undetermined > 0 ? (
        <FilterChip pressed={filter === 'undetermined'} count={counts.undetermined} words="Undetermined" className="[&>span:nth-of-type(1)]:sr-only" mark={<Mark kind="undetermined" size={14} silent />} onClick={() => onFilter(filter === 'undetermined' ? 'all' : 'undetermined')} />
      ) : null}
    </div>
  );
}
