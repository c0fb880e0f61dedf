import { voltsWords } from '@/components/ladder/plan-words';
import type { Circuit } from '@/lib/schemas/circuit';
import { signedFacts, topVolts } from './circuit-facts';

/** How far the circuit is signed off, of how far its plan goes. */
export function SignedCell({ circuit }: { readonly circuit: Circuit }) {
  const { to, past } = signedFacts(circuit);
  const top = topVolts(circuit);
  const of = top === null ? 'no plan yet' : `of ${voltsWords(top)}`;
  if (to !== null) return <><b className="block font-mono text-md leading-tight font-bold">{voltsWords(to)}</b><span className="figure text-ink-2">{of}</span></>;
  return (
    <>
      <b className="block font-cond text-body leading-tight font-semibold">{past === null ? 'none' : 'not yet'}</b>
      <span className="figure text-ink-2">{past !== null && circuit.reached ? `${circuit.reached.letter}: ${voltsWords(past)} ${of}` : of}</span>
    </>
  );
}
