'use client';
import { useCallback, useMemo, useState } from 'react';
import { CautionsLine } from '@/components/circuit/cautions-line';
import { CircuitFrame } from '@/components/circuit/circuit-frame';
import { useCircuitPlace, useMay } from '@/components/circuit/circuit-context';
import { CircuitLoading } from '@/components/circuit/page-state';
import { PhoneSwitch } from '@/components/circuit/phone-switch';
import { ReadingRow } from '@/components/circuit/reading-row';
import { signedTo } from '@/components/circuit/signed-state';
import { useCircuit, useRevisionFindings, useRevisions, useThreads } from '@/components/circuit/use-circuit';
import { usePhonePane } from '@/components/circuit/use-phone-pane';
import { useShownAt } from '@/components/circuit/use-shown-at';
import { SheetViewer } from '@/components/drawing/sheet-viewer';
import { touchSafeVolts } from '@/components/ladder/ladder-point';
import { voltsWords } from '@/components/ladder/plan-words';
import { Margin } from '@/components/margin/margin';
import { MarginProvider } from '@/components/margin/margin-context';
import { marginEntries } from '@/components/margin/margin-entry';
import type { MarginAnchor, SheetGeometry } from '@/components/margin/sheet-geometry';
import { useSelectedEntry } from '@/components/margin/use-selected-entry';
import { useThreadActions } from '@/components/margin/use-thread-actions';
import { StatusStrip } from '@/components/shell/status-strip';
import { ButtonLink } from '@/components/ui/button-link';
import { Moment } from '@/components/ui/moment';
import { shortName } from '@/components/ui/initials';
import { Skeleton } from '@/components/ui/skeleton';
import { RevisionAct } from './revision-act';
import { RevisionPanel } from './revision-panel';
import { revisionWords, shortHash } from './revision-words';
import { useRevisionSheet } from './use-revision-sheet';

/** One revision: its drawing, the findings stored at its cut, the circuit's notes, and how far it is signed. */
export function RevisionPage({ letter, tab = 'revisions' }: { readonly letter: string; readonly tab?: 'sheet' | 'revisions' }) {
  const { circuitId, person } = useCircuitPlace();
  const may = useMay();
  const circuit = useCircuit(circuitId);
  const revisions = useRevisions(circuitId);
  const revision = revisions.data?.find((one) => one.letter === letter);
  const sheet = useRevisionSheet(revision?.id);
  const findings = useRevisionFindings(revision?.id);
  const threads = useThreads(circuitId, may('read the bench'));
  const actions = useThreadActions(circuitId, null);
  const [shown, show] = useShownAt(revision?.holdPoints ?? []);
  const [geometry, setGeometry] = useState<SheetGeometry | null>(null);
  const [selected, select] = useSelectedEntry();
  const [pane, setPane] = usePhonePane();
  const entries = useMemo(() => marginEntries(findings.data ?? [], threads.data ?? []), [findings.data, threads.data]);
  const lit = useCallback((anchor: MarginAnchor) => entries.some((entry) => entry.key === selected && entry.anchor === anchor), [entries, selected]);
  const jump = useCallback((anchor: MarginAnchor) => { setPane('drawing'); geometry?.reveal(anchor); }, [geometry, setPane]);

  if (!circuit.data || !revisions.data || !revision) {
    return <CircuitLoading error={circuit.error ?? revisions.error ?? (revisions.data && !revision ? new Error(letter) : null)} onRetry={() => { void circuit.refetch(); void revisions.refetch(); }} />;
  }
  const now = new Date();
  const point = revision.holdPoints.find((one) => one.name === shown);
  const to = signedTo(revision, now);
  const chosen = entries.find((entry) => entry.key === selected);
  const litParts = new Set(sheet.data?.parts.filter((part) => chosen && chosen.kind !== 'note' && chosen.finding.refs.includes(part.ref)).map((part) => part.id));
  const rights = { write: may('write notes'), edit: false, mentor: may('resolve a note') && may('sign off'), personId: person?.id ?? null };
  const guestFoot = person ? undefined : (
    <div className="border-[1.5px] border-dashed border-edge p-4"><p className="text-body font-semibold">Members write here</p><p className="mb-2.5 text-md text-ink-2">Sign in, or ask a maker for an invitation to the bench.</p><ButtonLink href={`/sign-in?to=/circuits/${circuitId}/revisions/${letter}`}>Sign in to write</ButtonLink></div>
  );
  return (
    <CircuitFrame
      title={circuit.data.title}
      under={`Revision ${letter}, ${revisionWords(revision, now).replace(/^\p{Lu}/u, (letter) => letter.toLowerCase())}`}
      tab={tab}
      letters={revisions.data.map((one) => one.letter)}
      back={{ href: `/circuits/${circuitId}/revisions`, words: 'Back to the revisions' }}
      ladder={<ReadingRow revisions={revisions.data} revision={revision} shown={shown} onShow={show} findings={findings.data} act={<RevisionAct revision={revision} />} />}
      cautions={point && point.volts > touchSafeVolts ? <CautionsLine volts={point.volts} /> : null}
      foot={<><PhoneSwitch pane={pane} count={entries.length} onPane={setPane} /><section aria-label="Next step" className="flex-none border-t border-edge bg-panel p-2.5 empty:hidden tablet:hidden"><RevisionAct revision={revision} full /></section></>}
      status={<StatusStrip lamp={to ? 'ok' : 'caution'} state={revisionWords(revision, now)} notes={[<>Checked at the cut, <Moment at={revision.cutAt} form="medium" /></>, person ? null : 'Read only']} right={<span>Revision {letter}, hash <span className="figure">{shortHash(revision.contentHash)}</span></span>} />}
    >
      <RevisionPanel revisions={revisions.data} revision={revision} circuitId={circuitId} />
      <MarginProvider value={{ rights, actions }}>
        <div className="relative flex min-w-0 flex-1 bg-film">
          <div className={pane === 'drawing' ? 'flex min-w-0 flex-1' : 'flex min-w-0 flex-1 max-tablet:hidden'}>
            {sheet.data ? (
              <SheetViewer
                sheet={sheet.data}
                label={`Schematic, revision ${letter}`}
                lit={litParts}
                volts={sheet.data.volts[shown ?? ''] ?? {}}
                shown={point ? `Shown at ${voltsWords(point.volts)}` : undefined}
                onGeometry={setGeometry}
                titleBlock={[
                  { legend: 'Title', value: circuit.data.title, wide: true },
                  { legend: 'Drawn', value: shortName(revision.cutBy.name) },
                  { legend: 'Signed off', value: to ? `to ${voltsWords(to.volts)}, ${shortName(to.signOff.by.name)}` : 'not yet' },
                  { legend: 'Date', value: <Moment at={revision.cutAt} form="day" /> },
                  { legend: 'Revision', value: letter, strong: true },
                ]}
              />
            ) : <div aria-busy="true" className="drafting-grid m-6 flex-1 border-[1.5px] border-ink">{sheet.error ? <p role="alert" className="p-6 text-stop-ink">The drawing did not load.</p> : <Skeleton className="m-8 w-40" />}</div>}
          </div>
          <Margin
            className={pane === 'margin' ? '' : 'max-tablet:hidden'}
            entries={entries}
            geometry={geometry}
            plan={revision.holdPoints}
            shownVolts={point?.volts ?? null}
            checked={findings.data ? <>{findings.data.length} checks on {letter}, <Moment at={revision.cutAt} form="medium" /></> : 'loading'}
            selected={selected}
            onSelect={select}
            lit={lit}
            onJump={jump}
            empty={findings.data ? <p className="text-md text-ink-2">No finding and no note. Every check that ran passed or does not apply.</p> : <Skeleton className="w-40" />}
            foot={guestFoot}
          />
        </div>
      </MarginProvider>
    </CircuitFrame>
  );
}
