import Link from 'next/link';
import type { LadderScale } from '@/components/ladder/ladder-scale';
import { MiniLadder } from '@/components/ladder/mini-ladder';
import { voltsWords } from '@/components/ladder/plan-words';
import { classNames } from '@/components/ui/class-names';
import { Initials } from '@/components/ui/initials';
import { Moment } from '@/components/ui/moment';
import { RevisionLetter } from '@/components/ui/revision-letter';
import type { Circuit } from '@/lib/schemas/circuit';
import { circuitStateWords, signedFacts, topVolts, waitsFor } from './circuit-facts';
import { OpenCounts } from './open-counts';
import { SignedCell } from './signed-cell';

export const miniWidth = 196;

interface CircuitRowProps {
  readonly circuit: Circuit;
  readonly person: string;
  readonly scale: LadderScale;
}

function ladderWords(circuit: Circuit): string {
  const { to, past } = signedFacts(circuit);
  const top = topVolts(circuit);
  const blocked = circuit.blockedAt === null ? '' : `, blocked at ${voltsWords(circuit.blockedAt)}`;
  if (top === null) return `No power-up plan${blocked}`;
  return `${to === null ? past === null ? 'Not signed off' : `An earlier revision was signed off to ${voltsWords(past)}` : `Signed off to ${voltsWords(to)}`} of ${voltsWords(top)}${blocked}`;
}

/** One circuit of the bench's table. */
export function CircuitRow({ circuit, person, scale }: CircuitRowProps) {
  const { to, past } = signedFacts(circuit);
  const [maker] = circuit.makers;
  const [waiting, ...others] = circuit.waitingFor;
  return (
    <tr className="group">
      <td className={classNames('h-[62px] border-b border-rule px-2 py-1.5 group-last:border-b-0 group-hover:bg-film-2', waitsFor(circuit, person) && 'shadow-[inset_4px_0_0_var(--act)]')}>
        <Link href={`/circuits/${circuit.id}`} className="block text-body leading-tight font-semibold text-ink hover:underline">{circuit.title}</Link>
        <span className="text-xs text-ink-2">{maker ? `${maker.name}${circuit.makers.length > 1 ? ` +${circuit.makers.length - 1}` : ''}, ` : ''}<span className={circuit.state === 'signed off' && !circuit.draft ? 'font-semibold text-signed-ink' : 'text-ink'}>{circuitStateWords(circuit)}</span></span>
      </td>
      <td className="border-b border-rule px-2 group-last:border-b-0 group-hover:bg-film-2"><RevisionLetter letter={circuit.newest?.letter ?? null} /></td>
      <td className="border-b border-rule px-2 group-last:border-b-0 group-hover:bg-film-2 max-wide:hidden">
        <MiniLadder scale={scale} width={miniWidth} points={circuit.holdPoints.map((point) => point.volts)} signedTo={to} pastTo={past} blockedAt={circuit.blockedAt} words={ladderWords(circuit)} />
      </td>
      <td className="border-b border-rule px-2 group-last:border-b-0 group-hover:bg-film-2"><SignedCell circuit={circuit} /></td>
      <td className="border-b border-rule px-2 whitespace-nowrap group-last:border-b-0 group-hover:bg-film-2"><OpenCounts counts={circuit.counts} /></td>
      <td className="border-b border-rule px-2 group-last:border-b-0 group-hover:bg-film-2">
        {waiting ? (
          <span className="grid grid-cols-[auto_1fr] items-center gap-2">
            <Initials name={waiting.name} />
            <span className="min-w-0"><span className="block truncate text-body leading-tight">{waiting.id === person ? `${waiting.name} (you)` : waiting.name}{others.length > 0 ? ` +${others.length}` : ''}</span><span className="block truncate text-xs text-ink-2">{waiting.why}</span></span>
          </span>
        ) : <span className="text-ink-2">nobody</span>}
      </td>
      <td className="figure border-b border-rule px-2 text-right text-ink-2 group-last:border-b-0 group-hover:bg-film-2"><Moment at={circuit.changedAt} /></td>
    </tr>
  );
}
