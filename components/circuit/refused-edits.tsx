'use client';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Mark } from '@/components/ui/mark';
import type { SheetSession, SheetSnapshot } from '@/realtime/client/sheet-session';

/** Edits that the server refused: listed to their author with what can be done, until each is let go. */
export function RefusedEdits({ session, snapshot }: { readonly session: SheetSession; readonly snapshot: SheetSnapshot }) {
  const [failed, setFailed] = useState<string | null>(null);
  if (snapshot.refused.length === 0) return null;
  return (
    <section aria-labelledby="refused-edits" role="alert" className="flex-none border-b border-stop bg-stop-wash px-4 py-2 text-ink">
      <h2 id="refused-edits" className="flex items-center gap-2 text-body font-semibold"><Mark kind="stop" size={18} silent />{snapshot.refused.length} {snapshot.refused.length === 1 ? 'edit was' : 'edits were'} not taken and {snapshot.refused.length === 1 ? 'is' : 'are'} no longer on the sheet</h2>
      <ul className="mt-1 space-y-1">
        {snapshot.refused.map((edit) => (
          <li key={edit.id} className="flex flex-wrap items-center gap-2 text-md">
            <span className="min-w-0 flex-1">{edit.words}</span>
            <Button size="small" onClick={() => void session.tryAgain(edit.id).then((done) => setFailed(done === false ? edit.id : null))}>Try again</Button>
            <Button size="small" onClick={() => void navigator.clipboard.writeText(session.textOf(edit.id))}>Copy</Button>
            <Button size="small" tone="flat" onClick={() => void session.letGo(edit.id)}>Let it go</Button>
            {failed === edit.id ? <span className="w-full text-sm text-stop-ink">It leans on another edit that was refused: make it again by hand, from the copy.</span> : null}
          </li>
        ))}
      </ul>
    </section>
  );
}
