'use client';
import { useState, type FormEvent } from 'react';
import { Button } from '@/components/ui/button';
import { useAct } from './use-act';

interface ReplyFormProps {
  readonly label: string;
  readonly onSend: (body: string) => Promise<unknown>;
  readonly initial?: string;
  readonly send?: string;
  readonly onCancel?: () => void;
  readonly autoFocus?: boolean;
}

/** A line to write in; what was typed stays when sending fails. Enter sends, Shift and Enter make a new line. */
export function ReplyForm({ label, onSend, initial = '', send = 'Send', onCancel, autoFocus = false }: ReplyFormProps) {
  const [body, setBody] = useState(initial);
  const { busy, error, run } = useAct();
  const submit = async (event?: FormEvent) => {
    event?.preventDefault();
    if (body.trim() === '') return;
    if (await run(() => onSend(body.trim()))) setBody('');
  };
  return (
    <form onSubmit={(event) => void submit(event)} className="mt-[7px] mr-2.5">
      <div className="flex items-start gap-1.5">
        <textarea
          aria-label={label}
          placeholder={label}
          value={body}
          autoFocus={autoFocus}
          rows={Math.min(5, Math.max(1, body.split('\n').length, Math.ceil(body.length / 34)))}
          onChange={(event) => setBody(event.target.value)}
          onKeyDown={(event) => {
            if (event.key === 'Enter' && !event.shiftKey && !event.nativeEvent.isComposing) void submit(event);
            else if (event.key === 'Escape' && onCancel) { event.stopPropagation(); onCancel(); }
          }}
          className="min-h-[30px] min-w-0 flex-1 resize-none rounded-key border border-edge bg-film px-2 py-[5px] text-sm leading-[18px] text-ink max-tablet:min-h-target max-tablet:py-2.5 max-tablet:text-lg"
        />
        <Button type="submit" busy={busy}>{send}</Button>
        {onCancel ? <Button tone="flat" onClick={onCancel}>Cancel</Button> : null}
      </div>
      {error ? <p role="alert" className="mt-1 text-xs text-stop-ink">{error} What you wrote is still here.</p> : null}
    </form>
  );
}
