'use client';
import type { ReactNode } from 'react';
import { voltsWords } from '@/components/ladder/plan-words';
import { Button } from '@/components/ui/button';
import { Figures } from '@/components/ui/figures';
import { Mark } from '@/components/ui/mark';
import { EntryHead } from './entry-head';
import { EvidenceTable } from './evidence-table';
import { fromWords, notReached, splitMessage } from './finding-words';
import type { FindingEntry } from './margin-entry';
import { useMargin } from './margin-context';
import { ProposedChange } from './proposed-change';
import { ReplyForm } from './reply-form';
import { ThreadActs } from './thread-acts';
import { ThreadMessages } from './thread-messages';

export interface EntryViewProps {
  readonly selected: boolean;
  readonly folded: boolean;
  readonly plan: readonly { readonly name: string; readonly volts: number }[];
  readonly shownVolts: number | null;
  readonly locator: ReactNode;
  readonly onSelect: () => void;
}

const words = { stop: 'Stop', caution: 'Caution', advice: 'Advice', undetermined: 'Undetermined' } as const;

export function FindingEntryView({ entry, selected, folded, plan, shownVolts, locator, onSelect }: EntryViewProps & { readonly entry: FindingEntry }) {
  const { rights, actions } = useMargin();
  const { finding, number, kind, threads } = entry;
  const { head, rest } = splitMessage(finding.message);
  const later = notReached(finding, shownVolts);
  return (
    <>
      <EntryHead
        kind={kind}
        mark={<Mark kind={kind} label={kind === 'undetermined' ? '?' : number} silent />}
        words={`${words[kind]}`}
        folded={folded && !selected ? <Figures>{head}</Figures> : undefined}
        right={fromWords(finding, plan)}
        locator={locator}
        selected={selected}
        onSelect={onSelect}
      />
      {folded && !selected ? null : (
        <div className="pb-0.5">
          <p className={kind === 'stop' ? 'mt-[5px] text-body leading-tight font-semibold text-ink' : 'mt-[3px] text-ink'}><Figures>{head}</Figures></p>
          {rest ? <p className="mt-[3px] text-ink-2"><Figures>{rest}</Figures></p> : null}
          {finding.remedy ? <p className="mt-[3px] text-ink-2"><Figures>{finding.remedy.words}</Figures></p> : null}
          {later && shownVolts !== null ? <p className="mt-[3px] text-ink-2">Not reached at <span className="figure">{voltsWords(shownVolts)}</span>.</p> : null}
          {selected ? <ProposedChange finding={finding} /> : null}
          {threads.map((thread) => (
            <div key={thread.id} id={`note-${thread.id}`}>
              <ThreadMessages messages={thread.messages} />
              {selected ? <ThreadActs thread={thread} label={`Reply to ${number}`} /> : null}
            </div>
          ))}
          {selected && rights.write && threads.length === 0 ? (
            <ReplyForm label={`Note on ${number}`} onSend={(body) => actions.open({ anchor: { kind: 'finding', id: finding.fingerprint }, body, mustAnswer: false })} />
          ) : null}
          {selected ? <EvidenceTable evidence={finding.evidence} /> : null}
          {selected ? <CopyLink id={entry.key} /> : null}
        </div>
      )}
    </>
  );
}

function CopyLink({ id }: { readonly id: string }) {
  const copy = () => void navigator.clipboard.writeText(`${window.location.origin}${window.location.pathname}${window.location.search}#${id}`);
  return <Button size="small" tone="flat" onClick={copy} className="mt-1 -ml-2.5">Copy link</Button>;
}
