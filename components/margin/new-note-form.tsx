'use client';
import { useState, type FormEvent } from 'react';
import { Button } from '@/components/ui/button';
import { Checkbox } from '@/components/ui/choice';
import { TextArea } from '@/components/ui/field';
import { Mark } from '@/components/ui/mark';
import type { Anchor } from '@/lib/schemas/thread';
import { useMargin } from './margin-context';
import { useAct } from './use-act';

interface NewNoteFormProps {
  readonly anchor: Anchor;
  readonly target: string;
  readonly onDone: (thread: string) => void;
  readonly onCancel: () => void;
}

/** A new margin note, tied to what was chosen on the sheet. */
export function NewNoteForm({ anchor, target, onDone, onCancel }: NewNoteFormProps) {
  const { actions } = useMargin();
  const [body, setBody] = useState('');
  const [mustAnswer, setMustAnswer] = useState(false);
  const { busy, error, run } = useAct();
  const submit = async (event: FormEvent) => {
    event.preventDefault();
    if (body.trim() === '') return;
    await run(async () => onDone((await actions.open({ anchor, body: body.trim(), mustAnswer })).id));
  };
  return (
    <form onSubmit={(event) => void submit(event)} className="border-[1.5px] border-act bg-film-2 p-3" aria-label={`New note on ${target}`}>
      <p className="mb-2 flex items-center gap-2 font-cond text-sm font-semibold tracking-[.04em] text-act uppercase"><Mark kind="note" silent />Note on {target}</p>
      <TextArea label="What should the makers see" rows={3} value={body} onChange={(event) => setBody(event.target.value)} error={error} autoFocus onKeyDown={(event) => { if (event.key === 'Escape') onCancel(); }} />
      <div className="mt-2 flex flex-wrap items-center gap-2">
        <Checkbox checked={mustAnswer} onChange={(event) => setMustAnswer(event.target.checked)}>Must answer: nobody signs while it is open</Checkbox>
      </div>
      <div className="mt-2 flex gap-2">
        <Button type="submit" tone="primary" busy={busy}>Write it</Button>
        <Button onClick={onCancel}>Leave it</Button>
      </div>
    </form>
  );
}
