import Link from 'next/link';
import { Moment } from '@/components/ui/moment';
import { RevisionLetter } from '@/components/ui/revision-letter';
import type { Circuit } from '@/lib/schemas/circuit';
import { waitsFor } from './circuit-facts';

/** What waits for the reader, and why. */
export function WaitingList({ circuits, person }: { readonly circuits: readonly Circuit[]; readonly person: string }) {
  const waiting = circuits.filter((circuit) => waitsFor(circuit, person));
  return (
    <section aria-labelledby="waiting-for-you">
      <h2 id="waiting-for-you" className="silk flex items-center gap-2 text-sm text-ink max-tablet:px-3.5 max-tablet:py-3">Waiting for you <span className="font-mono text-xs font-normal text-ink-2">{waiting.length}</span></h2>
      {waiting.length === 0 ? <p className="mt-2 text-md text-ink-2 max-tablet:px-3.5 max-tablet:pb-3">Nothing waits for you.</p> : (
        <ul className="mt-2 max-tablet:mt-0">
          {waiting.map((circuit) => (
            <li key={circuit.id} className="border-t border-rule max-tablet:shadow-[inset_4px_0_0_var(--act)]">
              <Link href={`/circuits/${circuit.id}`} className="grid grid-cols-[auto_1fr_auto] items-start gap-2.5 py-2.5 hover:bg-film-2 max-tablet:min-h-[58px] max-tablet:px-3.5">
                <RevisionLetter letter={circuit.newest?.letter ?? null} size="small" />
                <span className="min-w-0">
                  <span className="block text-body leading-tight font-semibold first-letter:uppercase">{circuit.waitingFor.find((one) => one.id === person)?.why}</span>
                  <span className="block truncate text-sm text-ink-2">{circuit.title}</span>
                </span>
                <span className="figure text-xs text-ink-2"><Moment at={circuit.changedAt} /></span>
              </Link>
            </li>
          ))}
        </ul>
      )}
    </section>
  );
}
