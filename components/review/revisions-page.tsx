'use client';
import { useState } from 'react';
import { CautionsLine } from '@/components/circuit/cautions-line';
import { CircuitFrame } from '@/components/circuit/circuit-frame';
import { useCircuitPlace, useMay } from '@/components/circuit/circuit-context';
import { LadderRow } from '@/components/circuit/ladder-row';
import { MakersPanel } from '@/components/circuit/makers-panel';
import { CircuitLoading } from '@/components/circuit/page-state';
import { RevisionBlock } from '@/components/circuit/revision-block';
import { signedState } from '@/components/circuit/signed-state';
import { draftWords } from '@/components/circuit/draft-words';
import { useCircuit, useRevisionFindings, useRevisions, useSheetFindings } from '@/components/circuit/use-circuit';
import { useShownAt } from '@/components/circuit/use-shown-at';
import { ladderPoints, touchSafeVolts } from '@/components/ladder/ladder-point';
import { marginEntries } from '@/components/margin/margin-entry';
import { stopFlags } from '@/components/margin/stop-flags';
import { StatusStrip } from '@/components/shell/status-strip';
import { Button } from '@/components/ui/button';
import { ButtonLink } from '@/components/ui/button-link';
import { StateBox } from '@/components/ui/state-box';
import { nextRevisionLetter } from '@/lib/netlist/designators/revision-letter';
import { CutDialog } from './cut-dialog';
import { ObjectionsPanel } from './objections-panel';
import { RevisionList } from './revision-list';
import { useReviewActs } from './use-review-acts';

/** All revisions of a circuit: what was cut when, in which state, signed to what by whom. */
export function RevisionsPage() {
  const { circuitId, person } = useCircuitPlace();
  const may = useMay();
  const circuit = useCircuit(circuitId);
  const revisions = useRevisions(circuitId);
  const acts = useReviewActs(circuitId);
  const newest = revisions.data?.[0];
  const edited = circuit.data !== undefined && revisions.data !== undefined && (circuit.data.draft || newest === undefined);
  const stored = useRevisionFindings(edited ? undefined : newest?.id);
  const current = useSheetFindings(circuitId, edited && person !== null);
  const [cutting, setCutting] = useState(false);
  const [shown, show] = useShownAt(circuit.data?.holdPoints ?? []);
  if (!circuit.data || !revisions.data) {
    return <CircuitLoading error={circuit.error ?? revisions.error} onRetry={() => { void circuit.refetch(); void revisions.refetch(); }} />;
  }
  const { title, holdPoints, draft, seq } = circuit.data;
  const moved = newest !== undefined && draft;
  const letter = nextRevisionLetter(newest?.letter ?? null);
  const objections = newest?.objections ?? [];
  const under = draftWords(newest, moved ? 'electrical' : 'not');
  const volts = holdPoints.find((point) => point.name === shown)?.volts ?? 0;
  return (
    <CircuitFrame
      title={title}
      under={under}
      tab="revisions"
      letters={revisions.data.map((revision) => revision.letter)}
      ladder={<LadderRow block={<RevisionBlock letter={null} title={under} />} points={ladderPoints(holdPoints)} shown={shown} onShow={show} signed={signedState(revisions.data, null, draft, new Date())} flags={stopFlags(marginEntries((edited ? current.data : stored.data) ?? [], []), holdPoints)} act={may('cut a revision') ? <><p><b className="block font-medium text-silk">{newest && !moved ? 'Nothing changed since' : 'The sheet is a draft'}</b>{newest && !moved ? `${newest.letter} is the sheet as it is` : `Cut ${letter}, then ask for review`}</p><Button tone="primary" icon="cut" className="self-start" onClick={() => setCutting(true)}>Cut revision {letter}</Button></> : <p><b className="block font-medium text-silk">{under}</b>A peer’s opinion of each drawing</p>} />}
      cautions={volts > touchSafeVolts ? <CautionsLine volts={volts} /> : null}
      status={<StatusStrip lamp="ok" state={`${revisions.data.length} ${revisions.data.length === 1 ? 'revision' : 'revisions'}`} right="A sign-off covers one revision, never the edited sheet" />}
    >
      <div className="min-w-0 flex-1 overflow-y-auto bg-film px-6 py-3 text-ink max-tablet:p-0">
        <div className="mx-auto max-w-[1180px] space-y-4">
          <div className="flex flex-wrap items-baseline gap-x-3 max-tablet:px-3.5 max-tablet:pt-3">
            <h2 className="font-cond text-xl font-semibold tracking-[.01em]">Revisions</h2>
            <p className="text-md text-ink-2">Each stays as it was cut. Only a revision is reviewed and signed.</p>
          </div>
          {revisions.data.length === 0 ? (
            <div className="max-w-[520px] max-tablet:px-3.5"><StateBox title="No revision yet" action={may('cut a revision') ? <Button tone="primary" icon="cut" onClick={() => setCutting(true)}>Cut revision A</Button> : <ButtonLink href={`/circuits/${circuitId}`}>To the sheet</ButtonLink>}>A revision is a cut of the sheet that cannot change any more: that is what a mentor signs.</StateBox></div>
          ) : <RevisionList revisions={revisions.data} circuitId={circuitId} />}
          <MakersPanel circuit={circuit.data} />
          <ObjectionsPanel objections={objections} personId={person?.id ?? null} mayOverride={may('override an objection')} acts={acts} />
        </div>
      </div>
      {cutting ? <CutDialog circuitId={circuitId} letter={letter} seq={seq} onClose={() => setCutting(false)} /> : null}
    </CircuitFrame>
  );
}
