'use client';
import { Initials, initialsOf, shortName } from '@/components/ui/initials';
import { Mark } from '@/components/ui/mark';
import { Moment } from '@/components/ui/moment';
import { EntryHead } from './entry-head';
import { EntryPill } from './entry-pill';
import type { EntryViewProps } from './finding-entry-view';
import type { NoteEntry } from './margin-entry';
import { ThreadActs } from './thread-acts';
import { ThreadMessages } from './thread-messages';

interface NoteEntryViewProps extends EntryViewProps {
  readonly entry: NoteEntry;
  /** What the note is on: 'R1', 'net GATE'; null when that is gone, undefined while the sheet is not there to ask. */
  readonly target: string | null | undefined;
}

export function NoteEntryView({ entry, target, selected, folded, locator, onSelect }: NoteEntryViewProps) {
  const { thread } = entry;
  const first = thread.messages[0];
  const initials = thread.by.name.length <= 3 ? thread.by.name : initialsOf(thread.by.name);
  const resolved = thread.status === 'resolved';
  const pill = resolved ? <EntryPill look="resolved" icon="check">resolved</EntryPill>
    : thread.mustAnswer ? <EntryPill look="must" icon="flag">must answer</EntryPill>
      : thread.status === 'answered' ? <EntryPill look="answered">answered</EntryPill> : null;
  return (
    <>
      <EntryHead
        kind="note"
        mark={<Mark kind="note" label={initials} silent />}
        words={target === undefined ? shortName(thread.by.name) : `${shortName(thread.by.name)} on ${target ?? 'a part that is gone'}`}
        folded={folded && !selected ? first?.body : undefined}
        pills={pill}
        right={<Moment at={thread.at} />}
        locator={locator}
        selected={selected}
        quiet={resolved}
        lost={target === null}
        onSelect={onSelect}
      />
      {folded && !selected ? null : (
        <div className="pb-0.5">
          <ThreadMessages messages={resolved && !selected ? thread.messages.slice(0, 1) : thread.messages} firstTagged={false} />
          {target === null ? <p className="mt-1 text-xs text-ink-2">What this note was on is gone from the sheet. It can still be answered and resolved.</p> : null}
          {selected ? <ThreadActs thread={thread} label={`Reply to ${shortName(thread.by.name)}`} /> : null}
          {selected && thread.revision ? <p className="mt-1 flex items-center gap-1.5 text-xs text-ink-2">Written on revision {thread.revision.letter} <Initials name={thread.by.name} size="small" /></p> : null}
        </div>
      )}
    </>
  );
}
