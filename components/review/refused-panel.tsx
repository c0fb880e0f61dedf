import Link from 'next/link';
import { voltsWords } from '@/components/ladder/plan-words';
import { Mark } from '@/components/ui/mark';
import { RequirementMark } from '@/components/ui/requirement-mark';
import { codes } from '@/lib/errors/codes';
import type { Revision } from '@/lib/schemas/revision';
import { reasonsAgainst, type RequirementRow } from './requirement-words';

interface RefusedPanelProps {
  readonly revision: Revision;
  readonly rows: readonly RequirementRow[];
  readonly free: number;
  readonly circuitId: string;
}

/** What is refused above the highest point that can be signed, and the way out of each. */
export function RefusedPanel({ revision, rows, free, circuitId }: RefusedPanelProps) {
  const refused = revision.holdPoints.slice(free).flatMap((point) => reasonsAgainst(rows, point.name).map((reason) => ({ point, reason })));
  const first = refused.filter(({ reason, point }, index) => refused.findIndex((other) => other.reason.id === reason.id && other.reason.refs.join() === reason.refs.join()) === index || revision.holdPoints[free] === point);
  if (first.length === 0) return null;
  const below = revision.holdPoints[free - 1];
  return (
    <section aria-labelledby="refused" className="border-[1.5px] border-stop bg-film text-ink max-tablet:border-x-0">
      <div className="flex min-h-9 items-center gap-2.5 border-b border-stop px-3">
        <Mark kind="stop" size={18} silent />
        <h2 id="refused" className="silk text-sm text-stop-ink">{below ? `Refused above ${voltsWords(below.volts)}` : 'Refused at every hold point'}</h2>
      </div>
      <ul>
        {first.map(({ point, reason }, index) => (
          <li key={index} className="grid grid-cols-[20px_64px_1fr_auto] items-center gap-3 border-b border-rule px-3 py-2.5 max-tablet:grid-cols-[20px_1fr]">
            <RequirementMark result={reason.result} />
            <b className="font-mono text-sm font-bold tracking-[-.03em]">{voltsWords(point.volts)}</b>
            <div className="min-w-0 text-md leading-tight max-tablet:col-span-2">
              <p>{codes[reason.id as keyof typeof codes]?.title ?? reason.words} {reason.restsOn ? <span className="text-ink-2">{reason.restsOn}</span> : null}</p>
              <p className="text-sm text-ink-2">{codes[reason.id as keyof typeof codes]?.advice ?? ''}</p>
            </div>
            <WayOut id={reason.id} circuitId={circuitId} letter={revision.letter} at={point.name} />
          </li>
        ))}
      </ul>
      <p className="px-3 py-2.5 text-sm text-ink-2">A sign-off is a peer’s opinion of this drawing, not a certificate. Local rules and licensed practice come first.</p>
    </section>
  );
}

function WayOut({ id, circuitId, letter, at }: { readonly id: string; readonly circuitId: string; readonly letter: string; readonly at: string }) {
  const link = 'inline-flex h-7 items-center justify-center rounded-key border border-edge bg-key px-2.5 font-cond text-xs font-semibold tracking-[.05em] text-silk uppercase hover:bg-key-hi max-tablet:h-target';
  const place = encodeURIComponent(at);
  switch (id) {
    case 'open-stop':
    case 'rule-error': return <Link className={link} href={`/circuits/${circuitId}/revisions/${letter}?at=${place}`}>Show on {letter}</Link>;
    case 'must-answer': return <Link className={link} href={`/circuits/${circuitId}`}>To the margin</Link>;
    case 'sign-in-again': return <Link className={link} href={`/sign-in?to=${encodeURIComponent(`/circuits/${circuitId}/revisions/${letter}/sign`)}`}>Sign in again</Link>;
    case 'newer-revision': return <Link className={link} href={`/circuits/${circuitId}/revisions`}>Revisions</Link>;
    default: return null;
  }
}
