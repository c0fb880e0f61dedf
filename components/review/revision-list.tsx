import Link from 'next/link';
import { signedTo } from '@/components/circuit/signed-state';
import { voltsWords } from '@/components/ladder/plan-words';
import { Mark } from '@/components/ui/mark';
import { Moment } from '@/components/ui/moment';
import { RevisionLetter } from '@/components/ui/revision-letter';
import type { Revision } from '@/lib/schemas/revision';
import { revisionWords, shortHash } from './revision-words';

function signedBy(revision: Revision, now: Date): string {
  const to = signedTo(revision, now);
  if (to) return `to ${voltsWords(to.volts)}, ${to.signOff.by.name}`;
  return revision.signOffs.length > 0 ? 'void' : 'not signed';
}

/** All revisions, newest first, with how far each is signed and by whom. */
export function RevisionList({ revisions, circuitId }: { readonly revisions: readonly Revision[]; readonly circuitId: string }) {
  const now = new Date();
  return (
    <ol className="border-[1.5px] border-ink bg-film text-ink max-tablet:border-x-0">
      {revisions.map((revision) => (
        <li key={revision.id} className="border-b border-rule last:border-0">
          <Link href={`/circuits/${circuitId}/revisions/${revision.letter}`} className="grid min-h-[66px] grid-cols-[46px_minmax(0,1.5fr)_minmax(0,1fr)_150px_112px] items-center gap-x-4 px-3.5 py-2 hover:bg-film-2 max-wide:grid-cols-[46px_minmax(0,1fr)_auto] max-tablet:grid-cols-[34px_minmax(0,1fr)_auto]">
            <RevisionLetter letter={revision.letter} size="regular" past={revision.state === 'superseded'} struck={revision.state === 'withdrawn'} />
            <span className="min-w-0">
              <span className={`block text-body leading-tight font-semibold ${revision.state === 'signed off' ? 'text-signed-ink' : ''}`}>{revisionWords(revision, now)}</span>
              <span className="block truncate text-sm text-ink-2">cut <Moment at={revision.cutAt} form="medium" /> by {revision.cutBy.name}{revision.note ? `: ${revision.note}` : ''}</span>
            </span>
            <span className="min-w-0 truncate text-md text-ink-2 max-wide:hidden">{signedBy(revision, now)}</span>
            <span className="flex items-center gap-1.5 max-tablet:hidden">
              {(['stop', 'caution', 'advice'] as const).map((kind) => <span key={kind} className="inline-flex w-9 items-center gap-1">{revision.counts[kind] > 0 ? <><Mark kind={kind} size={16} /><b className="figure">{revision.counts[kind]}</b></> : <span aria-hidden="true" className="text-ink-2">–</span>}</span>)}
            </span>
            <span className="figure text-right text-xs text-ink-2">{shortHash(revision.contentHash)}</span>
          </Link>
        </li>
      ))}
    </ol>
  );
}
