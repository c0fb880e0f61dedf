'use client';
import type { ReactNode } from 'react';
import { SheetViewer } from '@/components/drawing/sheet-viewer';
import { voltsWords } from '@/components/ladder/plan-words';
import type { MarginEntry } from '@/components/margin/margin-entry';
import type { MarginAnchor, SheetGeometry } from '@/components/margin/sheet-geometry';
import { Moment } from '@/components/ui/moment';
import { shortName } from '@/components/ui/initials';
import { Skeleton } from '@/components/ui/skeleton';
import type { Editor } from '@/lib/editor/editor';
import type { EditorState } from '@/lib/editor/editor-state';
import type { Revision } from '@/lib/schemas/revision';
import type { Anchor } from '@/lib/schemas/thread';
import type { SheetSession, SheetSnapshot } from '@/realtime/client/sheet-session';
import { draftLetter } from './draft-words';
import type { PhonePane } from './phone-switch';

export interface SheetWorkspaceProps {
  readonly editor: Editor | null;
  readonly state: EditorState | null;
  readonly session: SheetSession | null;
  readonly snapshot: SheetSnapshot | null;
  readonly pane: PhonePane;
  readonly title: string;
  readonly newest: Revision | undefined;
  readonly moved: boolean;
  readonly shown: { readonly name: string; readonly volts: number } | null;
  /** Volts of each net at the hold point shown. */
  readonly volts: Readonly<Record<string, number>>;
  readonly selected: MarginEntry | null;
  readonly planning: boolean;
  readonly onPlanning: (planning: boolean) => void;
  readonly onGeometry: (geometry: SheetGeometry | null) => void;
  readonly onNote: (anchor: Anchor, words: string) => void;
  readonly margin: (form: { readonly anchor: MarginAnchor; readonly content: ReactNode } | null) => ReactNode;
}

/** Drawer, canvas and margin side by side. */
export function SheetWorkspace({ state, snapshot, pane, title, newest, moved, shown, volts, selected, onGeometry, margin }: SheetWorkspaceProps) {
  const litRefs = selected && selected.kind !== 'note' ? selected.finding.refs : [];
  return (
    <div className="relative flex min-w-0 flex-1 bg-film">
      <div className={pane === 'drawing' ? 'flex min-w-0 flex-1' : 'flex min-w-0 flex-1 max-tablet:hidden'}>
        {state ? (
          <SheetViewer
            sheet={state.shown}
            label={`Schematic, ${newest ? `draft after revision ${newest.letter}` : 'draft'}`}
            volts={volts}
            lit={new Set(state.shown.parts.filter((part) => litRefs.includes(part.ref)).map((part) => part.id))}
            shown={shown ? `Shown at ${voltsWords(shown.volts)}` : undefined}
            onGeometry={onGeometry}
            titleBlock={[
              { legend: 'Title', value: title, wide: true },
              { legend: 'Drawn', value: newest ? shortName(newest.cutBy.name) : '' },
              { legend: 'Date', value: newest ? <Moment at={newest.cutAt} form="day" /> : '' },
              { legend: 'Revision', value: draftLetter(newest, moved), strong: true },
            ]}
          />
        ) : (
          <div aria-busy="true" className="drafting-grid m-6 flex-1 border-[1.5px] border-ink p-8 max-tablet:m-0">
            {snapshot?.line.state === 'ended' ? <p role="alert" className="text-body text-stop-ink">{snapshot.line.why}</p> : <Skeleton className="w-40" />}
          </div>
        )}
      </div>
      {margin(null)}
    </div>
  );
}
