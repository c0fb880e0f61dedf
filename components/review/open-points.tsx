import { counted } from '@/components/ui/counted';
import Link from 'next/link';
import { fromWords, splitMessage } from '@/components/margin/finding-words';
import { findingKey, marginEntries } from '@/components/margin/margin-entry';
import { Figures } from '@/components/ui/figures';
import { shortName } from '@/components/ui/initials';
import { Mark } from '@/components/ui/mark';
import type { Finding } from '@/lib/netlist/findings/finding';
import type { Thread } from '@/lib/schemas/thread';

interface OpenPointsProps {
  readonly findings: readonly Finding[];
  readonly threads: readonly Thread[];
  readonly plan: readonly { readonly name: string; readonly volts: number }[];
  readonly circuitId: string;
  readonly letter: string;
}

const tones = { stop: 'text-stop-ink border-stop', caution: 'text-caution-ink border-caution-ink', advice: 'text-ink border-ink-2', undetermined: 'text-act border-act', note: 'text-act border-act' } as const;

/** What is open on a revision: told to whoever is asked, and no reason not to ask. */
export function OpenPoints({ findings, threads, plan, circuitId, letter }: OpenPointsProps) {
  const entries = marginEntries(findings, []).flatMap((entry) => (entry.kind === 'note' || entry.kind === 'advice' ? [] : [entry]));
  const must = threads.filter((thread) => thread.mustAnswer && thread.status !== 'resolved');
  const count = (kind: string) => entries.filter((entry) => entry.kind === kind).length;
  return (
    <section aria-labelledby="open-points" className="min-w-0 max-tablet:p-3.5">
      <h3 id="open-points" className="mb-2 flex flex-wrap items-baseline gap-2.5"><span className="silk text-sm">What is open</span><span className="text-sm text-ink-2">{counted(count('stop'), 'stop')}, {counted(count('caution'), 'caution')}, {count('undetermined')} undetermined, {must.length} must answer</span></h3>
      {entries.length + must.length === 0 ? <p className="text-md text-ink-2">Nothing is open.</p> : null}
      <ul className="space-y-2.5">
        {must.map((thread) => (
          <li key={thread.id}>
            <Link href={`/circuits/${circuitId}#note-${thread.id}`} className={`flex h-7 items-center gap-2 border-b font-cond text-sm font-semibold tracking-[.04em] uppercase hover:underline ${tones.note}`}><Mark kind="note" size={20} silent />{shortName(thread.by.name)}, must answer</Link>
            <p className="mt-1 text-md">{thread.messages[0]?.body}</p>
          </li>
        ))}
        {entries.slice(0, 12).map((entry) => (
          <li key={entry.key}>
            <Link href={`/circuits/${circuitId}/revisions/${letter}#${findingKey(entry.finding.fingerprint)}`} className={`flex h-7 items-center gap-2 border-b font-cond text-sm font-semibold tracking-[.04em] hover:underline ${tones[entry.kind]}`}>
              <Mark kind={entry.kind} label={entry.kind === 'undetermined' ? '?' : entry.number} size={20} silent />
              <span className="flex-1 uppercase">{entry.kind}</span>
              <span className="figure text-xs font-normal text-ink-2">{fromWords(entry.finding, plan)}</span>
            </Link>
            <p className="mt-1 text-md text-ink"><Figures>{splitMessage(entry.finding.message).head}</Figures></p>
          </li>
        ))}
      </ul>
      {entries.length > 12 ? <p className="mt-2 text-sm text-ink-2">and {entries.length - 12} more on <Link className="text-act underline" href={`/circuits/${circuitId}/revisions/${letter}`}>revision {letter}</Link></p> : null}
      {count('undetermined') > 0 ? <p className="mt-2 text-sm text-ink-2">Undetermined ones do not refuse a sign-off; the signer sees them.</p> : null}
    </section>
  );
}
