'use client';
import type { MarginEntry } from '@/components/margin/margin-entry';
import { voltsWords } from '@/components/ladder/plan-words';
import { StatusStrip } from '@/components/shell/status-strip';
import { Icon } from '@/components/ui/icon';
import { Moment } from '@/components/ui/moment';
import { HoverHint, ToolHint } from '@/components/sheet/sheet-hints';
import type { LiveFindings } from '@/lib/check/live-checker';
import type { Editor } from '@/lib/editor/editor';
import type { SheetSession, SheetSnapshot } from '@/realtime/client/sheet-session';
import { saveLamp, SaveWords } from './save-state';

/** What was checked, and when: '41 checks on the draft, 18:52'. */
export function CheckedWords({ live }: { readonly live: LiveFindings | null }) {
  if (!live) return <>checking</>;
  const ran = live.findings.filter((finding) => finding.outcome !== 'not applicable').length;
  return <>{ran} checks on the draft, {live.state === 'topology' ? 'numbers running' : live.state === 'failed' ? 'the engine did not answer' : <Moment at={new Date(live.at).toISOString()} />}</>;
}

interface SheetStatusProps {
  readonly editor: Editor | null;
  readonly session: SheetSession | null;
  readonly snapshot: SheetSnapshot | null;
  readonly live: LiveFindings | null;
  readonly entries: readonly MarginEntry[];
  readonly plan: readonly { readonly name: string; readonly volts: number }[];
  readonly message: string | null;
  readonly readOnly: boolean;
}

/** The foot of the sheet page: how far it is blocked, what the editor says, and the save mark. */
export function SheetStatus({ editor, session, snapshot, live, entries, plan, message, readOnly }: SheetStatusProps) {
  const stop = entries.find((entry) => entry.kind === 'stop');
  const at = stop?.kind === 'stop' ? plan.find((point) => point.name === stop.finding.holdPoint) ?? plan[0] : undefined;
  const open = entries.some((entry) => entry.kind === 'undetermined');
  const state = !live ? 'Checking' : stop ? at ? `Blocked at ${voltsWords(at.volts)}` : 'A stop is open' : plan.length === 0 ? 'Draft, no plan yet' : open ? 'No stop, not all determined' : 'Within limits';
  const lamp = saveLamp(snapshot);
  const others = snapshot?.others.length ?? 0;
  return (
    <StatusStrip
      lamp={!live ? 'working' : stop ? 'stop' : plan.length === 0 ? 'off' : open ? 'caution' : 'ok'}
      state={state}
      notes={[
        readOnly && snapshot?.loaded ? <span className="inline-flex items-center gap-1.5"><Icon name="lock" className="size-3" />{snapshot.room.state === 'quarantined' ? snapshot.room.why : 'Read only for you'}</span> : null,
        message,
        others === 0 ? 'Only you are here' : `${others + 1} people on the sheet`,
        editor ? <HoverHint editor={editor} /> : null,
      ]}
      right={
        <>
          {editor ? <span className="truncate text-silk-2"><ToolHint editor={editor} /></span> : null}
          <span className="flex items-center gap-3" role="status">
            {lamp === 'stop' || lamp === 'caution' ? <button type="button" onClick={() => session?.reconnect()} className="min-h-6 text-act underline underline-offset-[3px]">Try now</button> : null}
            <SaveWords snapshot={snapshot} />
          </span>
        </>
      }
    />
  );
}
