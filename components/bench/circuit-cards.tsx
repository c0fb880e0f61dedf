import Link from 'next/link';
import { classNames } from '@/components/ui/class-names';
import { RevisionLetter } from '@/components/ui/revision-letter';
import type { Circuit } from '@/lib/schemas/circuit';
import { circuitStateWords, waitsFor } from './circuit-facts';
import { SignedCell } from './signed-cell';

function underTitle(circuit: Circuit, person: string): string {
  const stops = circuit.openStops ?? 0;
  const [waiting] = circuit.waitingFor;
  const whom = !waiting ? '' : waitsFor(circuit, person) ? ' For you' : ` For ${waiting.name}`;
  return `${circuitStateWords(circuit)}${stops > 0 ? `, ${stops} ${stops === 1 ? 'stop' : 'stops'} open` : ''}.${whom}`;
}

/** The circuits on a phone: one target a row. */
export function CircuitCards({ circuits, person }: { readonly circuits: readonly Circuit[]; readonly person: string }) {
  return (
    <ul className="bg-film text-ink">
      {circuits.map((circuit) => (
        <li key={circuit.id} className={classNames('border-b border-rule', waitsFor(circuit, person) && 'shadow-[inset_4px_0_0_var(--act)]')}>
          <Link href={`/circuits/${circuit.id}`} className="grid min-h-[76px] grid-cols-[34px_1fr_auto] items-center gap-x-3 gap-y-0.5 px-3.5 py-2">
            <RevisionLetter letter={circuit.newest?.letter ?? null} />
            <span className="min-w-0">
              <span className="line-clamp-2 text-lg leading-tight font-semibold">{circuit.title}</span>
              <span className="block text-sm leading-[1.3] text-ink-2">{underTitle(circuit, person)}</span>
            </span>
            <span className="max-w-[130px] text-right text-xs"><SignedCell circuit={circuit} /></span>
          </Link>
        </li>
      ))}
    </ul>
  );
}
