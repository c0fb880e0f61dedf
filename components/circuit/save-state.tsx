'use client';
import type { SheetSnapshot } from '@/realtime/client/sheet-session';
import { Moment } from '@/components/ui/moment';
import type { Lamp } from '@/components/shell/status-strip';

const edits = (count: number): string => `${count} ${count === 1 ? 'edit' : 'edits'}`;

/** The save mark in words. It says 'saved' only of what the server has committed. */
export function SaveWords({ snapshot }: { readonly snapshot: SheetSnapshot | null }) {
  if (!snapshot) return <>Opening</>;
  const { save, line, loaded } = snapshot;
  if (!loaded) return line.state === 'ended' ? <b className="font-medium text-stop-ink">{line.why}</b> : <>Loading the sheet</>;
  switch (save.state) {
    case 'saved': return line.state === 'open' ? save.at === null ? <>Saved</> : <>Saved <Moment at={new Date(save.at).toISOString()} /></> : <span className="text-caution-ink">Not connected: {line.why}</span>;
    case 'saving': return <>Saving, {edits(save.edits)}</>;
    case 'not saved': return line.state === 'open'
      ? <b className="font-medium text-caution-ink">Not saved: {edits(save.edits)} kept here. {save.why}</b>
      : <><b className="font-medium text-caution-ink">Not saved: offline, kept here</b><span title={line.why}>{edits(save.edits)}, sent when the line is back</span></>;
  }
}

/** The lamp that goes with it. */
export function saveLamp(snapshot: SheetSnapshot | null): Lamp {
  if (!snapshot || !snapshot.loaded) return 'working';
  if (snapshot.room.state === 'quarantined' || snapshot.line.state === 'ended') return 'stop';
  if (snapshot.save.state === 'not saved' || snapshot.line.state !== 'open') return 'caution';
  return snapshot.save.state === 'saving' ? 'working' : 'ok';
}

/** Why a cut must wait: only what is committed can be cut. */
export function unsavedWords(snapshot: SheetSnapshot | null): string | null {
  if (!snapshot || !snapshot.loaded) return 'the sheet is loading';
  return snapshot.save.state === 'saved' ? null : `${edits(snapshot.save.edits)} not saved yet`;
}
