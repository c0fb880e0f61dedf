'use client';
import { useState } from 'react';
import { Initials } from '@/components/ui/initials';
import { Moment } from '@/components/ui/moment';
import { PlainText } from '@/components/ui/plain-text';
import type { Message } from '@/lib/schemas/thread';
import { useMargin } from './margin-context';
import { ReplyForm } from './reply-form';

function MessageLine({ message, tag }: { readonly message: Message; readonly tag: boolean }) {
  const { rights, actions } = useMargin();
  const [editing, setEditing] = useState(false);
  const { editMessage } = actions;
  if (editing && editMessage) {
    return (
      <li>
        <ReplyForm label="Your words" initial={message.body} send="Keep" autoFocus onCancel={() => setEditing(false)} onSend={async (body) => { await editMessage(message.id, body); setEditing(false); }} />
      </li>
    );
  }
  return (
    <li className={tag ? 'grid grid-cols-[28px_1fr] gap-[7px] text-ink' : 'text-ink-2'}>
      {tag ? <span className="pt-px"><Initials name={message.by.name} size="small" /></span> : null}
      <span className="min-w-0">
        <PlainText>{message.body}</PlainText>
        <span className="ml-1 font-mono text-legend tracking-[-.03em] text-ink-2"><Moment at={message.at} />{message.editedAt ? ', edited' : ''}</span>
        {editMessage && message.by.id === rights.personId ? (
          <button type="button" onClick={() => setEditing(true)} className="ml-2 min-h-6 font-cond text-xs font-semibold tracking-[.03em] text-act hover:underline max-tablet:min-h-target">Edit</button>
        ) : null}
      </span>
    </li>
  );
}

/** Messages of a thread. The first of a note's own entry stands without a tag: the head already says who. */
export function ThreadMessages({ messages, firstTagged = true }: { readonly messages: readonly Message[]; readonly firstTagged?: boolean }) {
  return (
    <ul className="mt-1 flex flex-col gap-[5px] pr-2.5">
      {messages.map((message, index) => <MessageLine key={message.id} message={message} tag={firstTagged || index > 0} />)}
    </ul>
  );
}
