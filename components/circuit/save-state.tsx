'use client';
import type { SheetSnapshot } from '@/realtime/client/sheet-session';
import { Moment } from '@/components/ui/moment';
import type { Lamp } from '@/components/shell/status-strip';

/** The save mark in words. It says 'saved' only of what the server has committed. */
export function SaveWords({ snapshot }: { readonly snapshot: SheetSnapshot | null }) {
  if (!snapshot) return <>Opening</>;
  const { save, line, loaded } = snapshot;
  if (!loaded) return line.state === 'ended' ? <b className="font-medium text-stop-ink">{line.why}</b> : <>Loading the sheet</>;
  switch (save.state) {
    case 'saved': return line.state === 'open' ? save.at === null ? <>Saved</> : <>Saved <Moment at={new Date(save.at).toISOString()} /></> : <span className="text-caution-ink">Not connected: {line.why}</span>;
    case 'saving': return <>Saving, {save.edits} {save.edits === 1 ? 'edit' : 'edits'}</>;
    case 'not saved': return <b className="font-medium text-caution-ink">Not saved: {save.edits} {save.edits === 1 ? 'edit' : 'edits'} kept here. {save.why}</b>;
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
  return snapshot.save.state === 'saved' ? null : `${snapshot.save.edits} ${snapshot.save.edits === 1 ? 'edit' : 'edits'} not saved yet`;
}
