'use client';
import Link from 'next/link';
import { classNames } from '@/components/ui/class-names';
import { Moment } from '@/components/ui/moment';
import { RevisionLetter } from '@/components/ui/revision-letter';
import { signedTo } from '@/components/circuit/signed-state';
import { voltsWords } from '@/components/ladder/plan-words';
import type { Revision } from '@/lib/schemas/revision';
import { hashWords, revisionWords } from './revision-words';

interface RevisionPanelProps {
  readonly revisions: readonly Revision[];
  readonly revision: Revision;
  readonly circuitId: string;
}

/** Beside the drawing of a revision: what it is, and the history with its sign-offs, each for one revision. */
export function RevisionPanel({ revisions, revision, circuitId }: RevisionPanelProps) {
  const now = new Date();
  return (
    <aside aria-label="Revisions" className="flex w-[196px] flex-none flex-col overflow-y-auto border-r border-edge bg-panel text-sm max-wide:hidden print:hidden">
      <dl className="space-y-2 px-3 py-2.5">
        <div><dt className="silk text-silk-2">State</dt><dd className="text-body">{revisionWords(revision, now)}</dd></div>
        <div><dt className="silk text-silk-2">Note</dt><dd className="wrap-anywhere">{revision.note || 'none'}</dd></div>
        <div><dt className="silk text-silk-2">Made by</dt><dd>{revision.contributors.map((person) => person.name).join(', ')}</dd></div>
        {revision.askedAt ? <div><dt className="silk text-silk-2">Asked</dt><dd><Moment at={revision.askedAt} form="medium" />, {revision.reviewers.length === 0 ? 'any mentor' : revision.reviewers.map((person) => person.name).join(', ')}</dd></div> : null}
        <div><dt className="silk text-silk-2">Hash</dt><dd className="figure">{hashWords(revision.contentHash)}</dd></div>
      </dl>
      <div className="groove-t mt-auto px-3 py-2.5">
        <h2 className="silk mb-1.5">Sign-offs, each for one revision</h2>
        <ol className="space-y-1">
          {revisions.slice(0, 8).map((one) => {
            const to = signedTo(one, now);
            return (
              <li key={one.id}>
                <Link href={`/circuits/${circuitId}/revisions/${one.letter}`} aria-current={one.id === revision.id ? 'page' : undefined} className={classNames('grid grid-cols-[24px_1fr] items-start gap-2 py-1 text-xs leading-[1.3] hover:bg-key', one.id === revision.id && 'font-semibold')}>
                  <RevisionLetter letter={one.letter} size="small" past={one.id !== revisions[0]?.id} struck={one.state === 'withdrawn'} />
                  <span>{to ? `To ${voltsWords(to.volts)}, ${to.signOff.by.name}` : revisionWords(one, now)}<span className="block font-normal text-silk-2"><Moment at={one.cutAt} form="day" /></span></span>
                </Link>
              </li>
            );
          })}
        </ol>
      </div>
    </aside>
  );
}
