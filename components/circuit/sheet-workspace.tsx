'use client';
import { useMemo, type ReactNode } from 'react';
import { voltsWords } from '@/components/ladder/plan-words';
import type { MarginEntry } from '@/components/margin/margin-entry';
import type { MarginAnchor, SheetGeometry } from '@/components/margin/sheet-geometry';
import { Moment } from '@/components/ui/moment';
import { shortName } from '@/components/ui/initials';
import { Skeleton } from '@/components/ui/skeleton';
import { SheetCanvas } from '@/components/sheet/canvas/sheet-canvas';
import { CommandList } from '@/components/sheet/command-list';
import { PartDrawer } from '@/components/sheet/drawer/part-drawer';
import { EmptySheet } from '@/components/sheet/empty-sheet';
import { formOf } from '@/components/sheet/forms/margin-form';
import { TwinTables } from '@/components/sheet/twin-tables';
import { usePresence } from '@/components/sheet/use-presence';
import { useResistorForm } from '@/components/sheet/use-resistor-form';
import type { Editor } from '@/lib/editor/editor';
import type { EditorState } from '@/lib/editor/editor-state';
import type { Revision } from '@/lib/schemas/revision';
import type { SheetSession, SheetSnapshot } from '@/realtime/client/sheet-session';
import { draftLetter, type Moved } from './draft-words';
import type { PhonePane } from './phone-switch';
import { signedTo } from './signed-state';

export interface SheetWorkspaceProps {
  readonly editor: Editor | null;
  readonly state: EditorState | null;
  readonly session: SheetSession | null;
  readonly snapshot: SheetSnapshot | null;
  readonly pane: PhonePane;
  readonly title: string;
  /** Who made the circuit, for the title block until a revision is cut. */
  readonly maker: string;
  readonly newest: Revision | undefined;
  readonly moved: Moved;
  readonly shown: { readonly name: string; readonly volts: number } | null;
  /** Volts of each net at the hold point shown. */
  readonly volts: Readonly<Record<string, number>>;
  readonly selected: MarginEntry | null;
  readonly planning: boolean;
  readonly onPlanning: (planning: boolean) => void;
  /** Whether the list of commands is open. */
  readonly listing: boolean;
  readonly onListing: (listing: boolean) => void;
  readonly onGeometry: (geometry: SheetGeometry | null) => void;
  readonly margin: (form: { readonly anchor: MarginAnchor; readonly content: ReactNode } | null) => ReactNode;
}

/** Gives the focus to the canvas, where the sheet's keys are live. */
function toCanvas(): void {
  document.querySelector<HTMLElement>('.sheet-canvas')?.focus();
}

/** What of the newest revision is signed, for the title block: `B to 12 V, R. Adeyemi`. */
function signedWords(newest: Revision | undefined): string {
  const to = newest && signedTo(newest, new Date());
  return to ? `${newest.letter} to ${voltsWords(to.volts)}, ${shortName(to.signOff.by.name)}` : 'nothing yet';
}

/** Drawer, canvas and margin side by side. */
export function SheetWorkspace({ editor, state, session, snapshot, pane, title, maker, newest, moved, shown, volts, selected, planning, onPlanning, listing, onListing, onGeometry, margin }: SheetWorkspaceProps) {
  const [zigzag, setZigzag] = useResistorForm();
  const pointAt = usePresence(session, state);
  const refs = selected && selected.kind !== 'note' ? selected.finding.refs : [];
  const wanted = refs.join(' ');
  const parts = state?.sheet.parts;
  const lit = useMemo(() => new Set((parts ?? []).filter((part) => part.ref !== '' && wanted.split(' ').includes(part.ref)).map((part) => part.id)), [parts, wanted]);
  const drawing = editor !== null && state !== null;
  return (
    <div className="flex min-w-0 flex-1 bg-film">
      {drawing && !state.readOnly ? <PartDrawer editor={editor} zigzag={zigzag} onZigzag={setZigzag} onTaken={toCanvas} /> : null}
      <div className="relative flex min-w-0 flex-1">
        <div className={pane === 'drawing' ? 'relative flex min-w-0 flex-1' : 'relative flex min-w-0 flex-1 max-tablet:hidden'}>
          {drawing ? (
            <>
              <SheetCanvas
                editor={editor}
                state={state}
                label={`Schematic, ${newest ? `draft after revision ${newest.letter}` : 'draft'}`}
                volts={volts}
                lit={lit}
                others={snapshot?.others ?? []}
                shown={shown ? `Shown at ${voltsWords(shown.volts)}` : undefined}
                zigzag={zigzag}
                onCursor={pointAt}
                onGeometry={onGeometry}
                titleBlock={[
                  { legend: 'Title', value: title, wide: true },
                  { legend: 'Drawn', value: shortName(newest?.cutBy.name ?? maker) },
                  { legend: 'Signed off', value: signedWords(newest) },
                  ...(newest ? [{ legend: 'Date', value: <Moment at={newest.cutAt} form="day" /> }] : []),
                  { legend: 'Revision', value: draftLetter(newest, moved), strong: true },
                ]}
              />
              {state.sheet.parts.length === 0 && state.ghost === null && !state.readOnly ? <EmptySheet editor={editor} onTaken={toCanvas} /> : null}
              {listing ? <CommandList editor={editor} onClose={() => { onListing(false); toCanvas(); }} /> : null}
              <TwinTables sheet={state.sheet} onSelect={(id) => { editor.run('select-items', { ids: [id] }); }} />
            </>
          ) : (
            <div aria-busy="true" className="drafting-grid m-6 flex-1 border-[1.5px] border-ink p-8 max-tablet:m-0">
              {snapshot?.line.state === 'ended' ? <p role="alert" className="text-body text-stop-ink">{snapshot.line.why}</p> : <Skeleton className="w-40" />}
            </div>
          )}
        </div>
        {margin(drawing ? formOf({ editor, state, planning, onPlanning, onClosed: toCanvas }) : null)}
      </div>
    </div>
  );
}
