'use client';
import { useEffect, useMemo, useRef, useState, type MouseEvent, type ReactNode } from 'react';
import { classNames } from '@/components/ui/class-names';
import { phoneQuery, useMedia, wideQuery } from '@/components/ui/use-media';
import type { Anchor } from '@/lib/schemas/thread';
import { layOutColumn } from './column-layout';
import { FindingEntryView } from './finding-entry-view';
import { LeaderLines } from './leader-lines';
import { routeLeaders, settleTops } from './leaders';
import { LocatorChip } from './locator-chip';
import { entryCounts, type MarginEntry } from './margin-entry';
import { MarginFilters, type MarginFilter } from './margin-filters';
import { NewNoteForm } from './new-note-form';
import { NoteEntryView } from './note-entry-view';
import type { MarginAnchor, SheetGeometry } from './sheet-geometry';
import { useHeights } from './use-heights';
import { useTargets } from './use-targets';

const headHeight = 68;
const formKey = 'form';

/** True for a press on an entry's own ground: not on something with an act of its own, and not the end of marking words. */
function pressedPlainly(event: MouseEvent<HTMLElement>): boolean {
  const own = event.target instanceof Element && event.target.closest('a, button, input, textarea, select, label, summary');
  return !own && (window.getSelection()?.isCollapsed ?? true);
}

export interface MarginProps {
  readonly entries: readonly MarginEntry[];
  readonly geometry: SheetGeometry | null;
  readonly plan: readonly { readonly name: string; readonly volts: number }[];
  readonly shownVolts: number | null;
  /** What was checked: '41 checks on the draft, 18:52'. */
  readonly checked: ReactNode;
  readonly selected: string | null;
  readonly onSelect: (key: string | null) => void;
  /** Entries whose other end is selected on the sheet. */
  readonly lit: (anchor: MarginAnchor) => boolean;
  /** Jumps to what an entry concerns; on a phone that also turns to the drawing. */
  readonly onJump: (anchor: MarginAnchor) => void;
  /** A property form is an entry tied to its part. */
  readonly form?: { readonly anchor: MarginAnchor; readonly content: ReactNode } | null;
  readonly draft?: { readonly anchor: Anchor; readonly words: string } | null;
  readonly onNewNote?: (() => void) | null;
  readonly onDraftDone?: (thread: string | null) => void;
  /** Stands where there is no entry yet, and at the foot for guests. */
  readonly empty?: ReactNode;
  readonly foot?: ReactNode;
  readonly className?: string;
}

/** Findings and notes in the height order of what they concern, each tied to it by a leader. */
export function Margin({ entries, geometry, plan, shownVolts, checked, selected, onSelect, lit, onJump, form, draft, onNewNote, onDraftDone, empty, foot, className }: MarginProps) {
  const wide = useMedia(wideQuery, true);
  const phone = useMedia(phoneQuery, false);
  const [filter, setFilter] = useState<MarginFilter>('all');
  const { now: heights, full: fullHeights, refOf, forget } = useHeights();
  const [scroll, setScroll] = useState(0);
  const column = useRef<HTMLDivElement>(null);

  const shown = useMemo(() => entries.filter((entry) => filter === 'all' || entry.kind === filter), [entries, filter]);
  const anchored = useMemo(() => (form ? [...shown, { key: formKey, anchor: form.anchor }] : shown), [shown, form]);
  const targets = useTargets(geometry, anchored);
  const room = Math.max(120, targets.height - headHeight - 12);

  const unknown = 64;
  const wanted = shown.reduce((sum, entry) => sum + (entry.kind === 'undetermined' ? 28 : fullHeights.get(entry.key) ?? heights.get(entry.key) ?? unknown) + 6, 0);
  const crowded = phone || Boolean(form) || (wide && targets.height > 0 && wanted > room);
  const foldedOf = (entry: MarginEntry) => entry.key !== selected && (crowded || entry.kind === 'undetermined');

  // Heights measured before the fonts were there are wrong: measure again.
  useEffect(() => {
    let over = false;
    void document.fonts.ready.then(() => { if (!over) forget(); });
    return () => { over = true; };
  }, [shown.length, forget]);

  const layout = layOutColumn(
    anchored.map((entry) => {
      const end = targets.of.get(entry.key)?.ends[0];
      return { key: entry.key, y: end ? Math.min(targets.height, Math.max(0, end.y)) - headHeight : null, height: heights.get(entry.key) ?? 28 };
    }),
    room,
  );
  const ordered = [...anchored].sort((a, b) => (layout.tops.get(a.key) ?? 0) - (layout.tops.get(b.key) ?? 0));
  const tied = wide && geometry !== null && targets.height > 0;
  const tops = tied ? settleTops(ordered.map(({ key }) => ({ key, top: layout.tops.get(key) ?? 0, height: heights.get(key) ?? 28 })), targets, headHeight, room) : layout.tops;
  const leaders = tied ? routeLeaders(ordered.map((entry) => {
    const listed = shown.find((one) => one.key === entry.key);
    return {
      key: entry.key,
      kind: listed?.kind ?? 'note',
      on: entry.key === selected || entry.key === formKey || (entry.anchor !== null && lit(entry.anchor)),
      top: headHeight + (tops.get(entry.key) ?? 0) - scroll,
    };
  }), targets, headHeight) : [];

  useEffect(() => {
    if (selected === null) return;
    document.getElementById(selected)?.scrollIntoView({ block: 'nearest' });
  }, [selected]);

  return (
    <>
      <LeaderLines leaders={leaders} width={targets.width + 24} height={targets.height} />
      <aside aria-label="Margin" className={classNames('relative flex w-[348px] flex-none flex-col bg-film text-ink max-wide:border-l max-wide:border-edge max-tablet:w-full max-tablet:flex-1 max-tablet:border-l-0 print:hidden', className)}>
        <div className="flex h-[68px] flex-none flex-col justify-center gap-1.5 pr-4 pl-3 max-tablet:h-auto max-tablet:border-b max-tablet:border-rule max-tablet:py-2">
          <div className="flex items-baseline gap-2">
            <h2 className="silk text-sm">Margin</h2>
            <span className="min-w-0 truncate text-xs text-ink-2">{checked}</span>
            {onNewNote ? <button type="button" onClick={onNewNote} className="ml-auto inline-flex min-h-6 flex-none items-center gap-1 text-xs text-ink-2 hover:text-act max-tablet:min-h-target"><span aria-hidden="true" className="text-lg leading-none">+</span>New note</button> : null}
          </div>
          <MarginFilters filter={filter} counts={entryCounts(entries)} onFilter={setFilter} />
        </div>
        <div ref={column} tabIndex={-1} onScroll={(event) => setScroll(event.currentTarget.scrollTop)} className="min-h-0 flex-1 overflow-x-hidden overflow-y-auto pr-4 max-tablet:pr-0">
          {draft && onDraftDone ? <div className="mb-2 pl-3 max-tablet:p-3"><NewNoteForm key={JSON.stringify(draft.anchor)} anchor={draft.anchor} target={draft.words} onDone={onDraftDone} onCancel={() => onDraftDone(null)} /></div> : null}
          {shown.length === 0 && !form ? <div className="pr-0 pl-3 max-tablet:p-4">{empty}</div> : null}
          <div className="relative" style={tied ? { height: layout.total > room ? layout.total + 8 : room } : undefined}>
            {ordered.map((placed) => {
              const style = tied ? { top: tops.get(placed.key) ?? 0, visibility: heights.has(placed.key) ? 'visible' as const : 'hidden' as const } : undefined;
              if (placed.key === formKey) {
                return <div key={formKey} ref={refOf(formKey)} style={style} className={classNames('pl-3', tied && 'absolute inset-x-0')}>{form?.content}</div>;
              }
              const entry = shown.find((one) => one.key === placed.key);
              if (!entry) return null;
              const target = targets.of.get(entry.key);
              const common = {
                selected: entry.key === selected,
                folded: foldedOf(entry),
                plan,
                shownVolts,
                locator: target && entry.anchor ? <LocatorChip zone={target.zone} words={target.words} onJump={() => entry.anchor && onJump(entry.anchor)} /> : null,
                onSelect: () => onSelect(entry.key === selected ? null : entry.key),
              };
              return (
                <article
                  key={entry.key}
                  id={entry.key}
                  ref={refOf(entry.key)}
                  style={style}
                  data-folded={common.folded ? '' : undefined}
                  onClick={(event) => { if (entry.key !== selected && pressedPlainly(event)) onSelect(entry.key); }}
                  className={classNames(
                    'cursor-default pl-3 text-sm leading-[1.34] max-wide:mb-1 max-tablet:mb-0 max-tablet:border-b max-tablet:border-rule max-tablet:pr-3.5 max-tablet:pl-3.5 max-tablet:text-body',
                    tied && 'absolute inset-x-0',
                    entry.key === selected && 'bg-film-2 pb-2 outline-2 -outline-offset-1 outline-act max-tablet:border-l-4 max-tablet:border-l-act max-tablet:outline-none',
                  )}
                >
                  {entry.kind === 'note'
                    ? <NoteEntryView {...common} entry={entry} target={geometry ? target?.words ?? null : ''} />
                    : <FindingEntryView {...common} entry={entry} />}
                </article>
              );
            })}
          </div>
        </div>
        {foot ? <div className="flex-none pr-4 pb-3 pl-3">{foot}</div> : null}
      </aside>
    </>
  );
}
