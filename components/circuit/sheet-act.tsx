'use client';
import { useState } from 'react';
import type { MarginEntry } from '@/components/margin/margin-entry';
import { pointWords } from '@/components/ladder/plan-words';
import { CutDialog } from '@/components/review/cut-dialog';
import { Button } from '@/components/ui/button';
import { ButtonLink } from '@/components/ui/button-link';
import { nextRevisionLetter } from '@/lib/netlist/designators/revision-letter';
import type { Revision } from '@/lib/schemas/revision';
import type { SheetSnapshot } from '@/realtime/client/sheet-session';
import { useCircuitPlace, useMay } from './circuit-context';
import { unsavedWords } from './save-state';

interface SheetActProps {
  readonly entries: readonly MarginEntry[];
  readonly plan: readonly { readonly name: string; readonly volts: number; readonly amps: number }[];
  readonly revisions: readonly Revision[];
  readonly moved: boolean;
  readonly snapshot: SheetSnapshot | null;
  readonly onPlan: (() => void) | null;
}

/** The next act on a sheet: set the plan, cut a revision, ask for its review. */
export function SheetAct({ entries, plan, revisions, moved, snapshot, onPlan }: SheetActProps) {
  const { circuitId } = useCircuitPlace();
  const may = useMay();
  const [cutting, setCutting] = useState(false);
  const newest = revisions[0];
  const letter = nextRevisionLetter(newest?.letter ?? null);
  const stops = entries.filter((entry) => entry.kind === 'stop');
  const blocked = plan.find((point) => stops.some((stop) => stop.kind === 'stop' && (stop.finding.holdPoint === null || stop.finding.holdPoint === point.name)));
  const words = plan.length === 0 ? 'No power-up plan yet'
    : stops.length === 0 ? 'No stop is open' : `${stops.length} ${stops.length === 1 ? 'stop blocks' : 'stops block'} ${blocked ? pointWords(blocked) : 'the plan'}`;
  const unsaved = unsavedWords(snapshot);
  return (
    <>
      <p>
        <b className="block font-medium text-silk">{words}</b>
        {onPlan ? <button type="button" onClick={onPlan} className="min-h-6 text-left underline underline-offset-[3px]">{plan.length === 0 ? 'Set the plan' : 'Change the plan'}</button>
          : newest && !moved ? `The sheet is as ${newest.letter}` : may('cut a revision') ? `Cut ${letter}, then ask for review` : 'A draft: nothing covers it'}
      </p>
      {may('ask for review') && newest && !moved && newest.state === 'cut'
        ? <ButtonLink href={`/circuits/${circuitId}/revisions/${newest.letter}/ask`} tone="primary" className="self-start">Ask for review of {newest.letter}</ButtonLink>
        : may('cut a revision') && (moved || !newest)
          ? <Button tone="primary" icon="cut" className="self-start" refused={unsaved} onClick={() => setCutting(true)}>Cut revision {letter}</Button>
          : newest ? <ButtonLink href={`/circuits/${circuitId}/revisions/${newest.letter}`} className="self-start">Revision {newest.letter}</ButtonLink> : null}
      {cutting ? <CutDialog circuitId={circuitId} letter={letter} seq={snapshot?.seq} onClose={() => setCutting(false)} /> : null}
    </>
  );
}
