'use client';
import { useCallback, useMemo, useState } from 'react';
import { touchSafeVolts } from '@/components/ladder/ladder-point';
import { Margin } from '@/components/margin/margin';
import { ToolStrip } from '@/components/sheet/tool-strip';
import { MarginProvider } from '@/components/margin/margin-context';
import { marginEntries, noteKey } from '@/components/margin/margin-entry';
import type { MarginAnchor, SheetGeometry } from '@/components/margin/sheet-geometry';
import { stopFlags } from '@/components/margin/stop-flags';
import { useSelectedEntry } from '@/components/margin/use-selected-entry';
import { useThreadActions } from '@/components/margin/use-thread-actions';
import type { Finding } from '@/lib/netlist/findings/finding';
import type { Anchor } from '@/lib/schemas/thread';
import { CautionsLine } from './cautions-line';
import { CircuitFrame } from './circuit-frame';
import { useCircuitPlace, useMay } from './circuit-context';
import { draftWords, movedSince } from './draft-words';
import { LadderRow } from './ladder-row';
import { MarginIntro } from './margin-intro';
import { CircuitLoading } from './page-state';
import { PeopleOnSheet } from './people-on-sheet';
import { PhoneSwitch } from './phone-switch';
import { planOfSheet } from './plan-of-sheet';
import { RefusedEdits } from './refused-edits';
import { RevisionBlock } from './revision-block';
import { roomPeople } from './room-people';
import { CheckedWords, SheetStatus } from './sheet-status';
import { SheetAct } from './sheet-act';
import { SheetWorkspace } from './sheet-workspace';
import { signedState } from './signed-state';
import { useCircuit, useRevisions, useThreads } from './use-circuit';
import { useEditor } from './use-editor';
import { useLiveFindings } from './use-live-findings';
import { useSheetSession } from './use-sheet-session';
import { usePhonePane } from './use-phone-pane';
import { useShownAt } from './use-shown-at';

/** The live sheet: editor, margin and ladder, shared with whoever else has it open. */
export function SheetPage() {
  const { circuitId, person } = useCircuitPlace();
  const may = useMay();
  const circuit = useCircuit(circuitId);
  const revisions = useRevisions(circuitId);
  const threads = useThreads(circuitId, true);
  const { session, snapshot } = useSheetSession(circuitId, person?.id ?? null);
  const { editor, state } = useEditor(snapshot);
  const title = circuit.data?.title ?? '';
  const sheet = state?.sheet ?? null;
  const live = useLiveFindings(sheet, title);
  const { points, plan } = useMemo(() => planOfSheet(sheet, circuit.data?.holdPoints ?? []), [sheet, circuit.data?.holdPoints]);
  const [shown, show] = useShownAt(plan);
  const [selected, select] = useSelectedEntry();
  const [geometry, setGeometry] = useState<SheetGeometry | null>(null);
  const [pane, setPane] = usePhonePane();
  const [draft, setDraft] = useState<{ readonly anchor: Anchor; readonly words: string } | null>(null);
  const [planning, setPlanning] = useState(false);
  const [listing, setListing] = useState(false);

  const entries = useMemo(() => marginEntries(live?.findings ?? [], threads.data ?? []), [live?.findings, threads.data]);
  const take = useCallback((finding: Finding) => { if (finding.remedy?.edits) editor?.run('take-change', { edits: finding.remedy.edits }); }, [editor]);
  const actions = useThreadActions(circuitId, state && !state.readOnly ? take : null);
  const refs = useMemo(() => new Set(state?.sheet.parts.filter((part) => state.selection.has(part.id)).map((part) => part.ref)), [state]);
  const lit = useCallback((anchor: MarginAnchor) => (anchor.kind === 'ref' ? refs.has(anchor.ref) : anchor.kind === 'part' ? state?.selection.has(anchor.id) ?? false : false), [refs, state]);
  const jump = useCallback((anchor: MarginAnchor) => { setPane('drawing'); geometry?.reveal(anchor); }, [geometry, setPane]);

  const newest = revisions.data?.[0];
  const moved = useMemo(() => (sheet ? movedSince(newest, sheet) : circuit.data?.draft === false ? 'not' : 'electrical'), [sheet, newest, circuit.data?.draft]);

  if (!circuit.data || !revisions.data || !person) {
    return <CircuitLoading error={circuit.error ?? revisions.error} onRetry={() => { void circuit.refetch(); void revisions.refetch(); }} />;
  }
  const point = points.find((one) => one.name === shown);
  const under = draftWords(newest, moved);
  const noteOn = (anchor: Anchor, words: string) => { setDraft({ anchor, words }); setPane('margin'); };
  const act = <SheetAct entries={entries} plan={plan} revisions={revisions.data} moved={moved !== 'not'} snapshot={snapshot} onPlan={may('edit the sheet') ? () => setPlanning(true) : null} />;
  return (
    <CircuitFrame
      title={circuit.data.title}
      under={under}
      tab="sheet"
      letters={revisions.data.map((one) => one.letter)}
      people={<PeopleOnSheet people={roomPeople(snapshot)} />}
      ladder={<LadderRow block={<RevisionBlock letter={null} title={under} under={circuit.data.makers.map((maker) => maker.name).join(', ')} />} points={points} shown={shown} onShow={show} signed={signedState(revisions.data, null, moved !== 'not', new Date())} flags={stopFlags(entries, points)} act={act} />}
      cautions={point && point.peak > touchSafeVolts ? <CautionsLine volts={point.peak} /> : null}
      foot={<>{session && snapshot ? <RefusedEdits session={session} snapshot={snapshot} /> : null}<PhoneSwitch pane={pane} count={entries.length} onPane={setPane} /></>}
      tools={editor ? <ToolStrip editor={editor} onCommands={() => setListing(!listing)} /> : null}
      status={<SheetStatus editor={editor} snapshot={snapshot} session={session} live={live} entries={entries} plan={plan} message={state?.message ?? null} readOnly={state?.readOnly ?? true} />}
    >
      <MarginProvider value={{ rights: { write: may('write notes'), edit: may('edit the sheet'), mentor: may('resolve a note') && !may('edit the sheet'), personId: person.id }, actions }}>
        <SheetWorkspace
          editor={editor}
          state={state}
          session={session}
          snapshot={snapshot}
          pane={pane}
          title={circuit.data.title}
          maker={circuit.data.makers[0]?.name ?? ''}
          newest={newest}
          moved={moved}
          shown={point ? { name: point.name, volts: point.peak } : null}
          volts={live?.volts[shown ?? ''] ?? {}}
          selected={entries.find((entry) => entry.key === selected) ?? null}
          planning={planning}
          onPlanning={setPlanning}
          listing={listing}
          onListing={setListing}
          onGeometry={setGeometry}
          margin={(form) => (
            <Margin
              className={pane === 'margin' ? '' : 'max-tablet:hidden'}
              entries={entries}
              geometry={geometry}
              plan={plan}
              shownVolts={point?.volts ?? null}
              checked={<CheckedWords live={live} />}
              selected={selected}
              onSelect={select}
              lit={lit}
              onJump={jump}
              form={form}
              draft={draft}
              onNewNote={may('write notes') ? () => noteOn(...noteTarget(state, geometry)) : null}
              onDraftDone={(thread) => { setDraft(null); if (thread) select(noteKey(thread)); }}
              empty={<MarginIntro empty={(state?.sheet.parts.length ?? 0) === 0} checking={live === null} />}
            />
          )}
        />
      </MarginProvider>
    </CircuitFrame>
  );
}

/** What a new note is about: the one selected part, else the middle of what is in view. */
function noteTarget(state: ReturnType<typeof useEditor>['state'], geometry: SheetGeometry | null): [Anchor, string] {
  const [only, ...more] = state?.sheet.parts.filter((part) => state.selection.has(part.id)) ?? [];
  if (only && more.length === 0) return [{ kind: 'part', id: only.id }, only.ref || 'this mark'];
  const spot = geometry?.spotInView() ?? { x: 0, y: 0 };
  return [{ kind: 'spot', x: spot.x, y: spot.y }, 'this spot'];
}
