'use client';
import { RevisionPage } from '@/components/review/revision-page';
import { CircuitFrame } from './circuit-frame';
import { useCircuitPlace } from './circuit-context';
import { CircuitLoading } from './page-state';
import { useCircuit, useRevisions } from './use-circuit';
import { StateBox } from '@/components/ui/state-box';

/** What a guest link shows: the newest revision with the findings stored at its cut. */
export function GuestSheetPage() {
  const { circuitId } = useCircuitPlace();
  const circuit = useCircuit(circuitId);
  const revisions = useRevisions(circuitId);
  if (!circuit.data || !revisions.data) return <CircuitLoading error={circuit.error ?? revisions.error} onRetry={() => { void circuit.refetch(); void revisions.refetch(); }} />;
  const newest = revisions.data[0];
  if (newest) return <RevisionPage letter={newest.letter} tab="sheet" />;
  return (
    <CircuitFrame title={circuit.data.title} under="No revision yet" tab="sheet" letters={[]}>
      <div className="grid flex-1 place-items-center bg-film p-6"><div className="max-w-[480px]"><StateBox title="No revision yet">Its makers have not cut a revision; a guest reads revisions only.</StateBox></div></div>
    </CircuitFrame>
  );
}
