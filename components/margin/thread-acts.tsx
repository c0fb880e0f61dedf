'use client';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import type { Thread } from '@/lib/schemas/thread';
import { useMargin } from './margin-context';
import { ReplyForm } from './reply-form';
import { useAct } from './use-act';

/** What may be done with a note now: reply, say it is done, resolve it, open it again. */
export function ThreadActs({ thread, label }: { readonly thread: Thread; readonly label: string }) {
  const { rights, actions } = useMargin();
  const { busy, error, run } = useAct();
  const [copied, setCopied] = useState(false);
  const own = thread.by.id === rights.personId;
  const mayResolve = rights.mentor || own || (rights.edit && !thread.mustAnswer);
  const link = async () => {
    await navigator.clipboard.writeText(`${window.location.origin}${window.location.pathname}${window.location.search}#note-${thread.id}`);
    setCopied(true);
  };
  return (
    <>
      {rights.write && thread.status !== 'resolved' ? <ReplyForm label={label} onSend={(body) => actions.reply(thread.id, body)} /> : null}
      <div className="mt-1.5 flex flex-wrap items-center gap-1.5">
        {rights.write && thread.status === 'open' && rights.edit ? <Button size="small" busy={busy} onClick={() => void run(() => actions.setStatus(thread.id, 'answered'))}>Answered</Button> : null}
        {rights.write && thread.status !== 'resolved' && mayResolve ? <Button size="small" icon="check" busy={busy} onClick={() => void run(() => actions.setStatus(thread.id, 'resolved'))}>Resolve</Button> : null}
        {rights.write && thread.status !== 'open' && mayResolve ? <Button size="small" busy={busy} onClick={() => void run(() => actions.setStatus(thread.id, 'open'))}>Open again</Button> : null}
        <Button size="small" tone="flat" onClick={() => void link()}>{copied ? 'Link copied' : 'Copy link'}</Button>
      </div>
      {error ? <p role="alert" className="mt-1 text-xs text-stop-ink">{error}</p> : null}
    </>
  );
}
