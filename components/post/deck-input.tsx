'use client';
import { useRef, type ReactNode } from 'react';
import { Button } from '@/components/ui/button';
import { classNames } from '@/components/ui/class-names';
import { Mark } from '@/components/ui/mark';

export interface DeckRefusal {
  /** Counted from 1. */
  readonly line: number;
  readonly reason: string;
}

const lineHeight = 'leading-[24px]';

/** The text of a deck with its line numbers; a refused line is marked in the gutter. */
export function DeckText({ deck, onChange, refused, describedBy }: { readonly deck: string; readonly onChange: (deck: string) => void; readonly refused: number | null; readonly describedBy?: string }) {
  const gutter = useRef<HTMLDivElement>(null);
  const lines = deck.split('\n').length;
  return (
    <div className="relative flex h-[420px] overflow-hidden font-mono text-sm tracking-[-.03em] max-tablet:h-[320px]">
      <div ref={gutter} aria-hidden="true" className={`w-9 flex-none overflow-hidden border-r border-rule bg-film-2 py-2 text-right text-ink-2 ${lineHeight}`}>
        {Array.from({ length: Math.max(lines, 17) }, (_, index) => (
          <div key={index} className={classNames('pr-2', index >= lines && 'invisible', refused === index + 1 && 'bg-stop font-bold text-on-stop')}>{index + 1}</div>
        ))}
      </div>
      <textarea
        aria-label="Deck"
        aria-describedby={describedBy}
        aria-invalid={refused !== null || undefined}
        value={deck}
        spellCheck={false}
        autoCapitalize="none"
        wrap="off"
        placeholder={'* Title of the circuit\nV1 vin 0 DC 24\n*@V1 role=supply\nR1 vin sw 6\n…\n.end'}
        onChange={(event) => onChange(event.target.value)}
        onScroll={(event) => { if (gutter.current) gutter.current.scrollTop = event.currentTarget.scrollTop; }}
        className={`min-w-0 flex-1 resize-none overflow-auto bg-film px-3 py-2 text-ink outline-none focus-visible:shadow-[inset_0_0_0_2px_var(--act)] max-tablet:text-lg ${lineHeight}`}
      />
    </div>
  );
}

interface DeckListingProps {
  readonly deck: string;
  readonly refusal: DeckRefusal;
  readonly onLine: (text: string) => void;
  readonly onWhole: () => void;
}

/** The deck as it was refused: the message stands under the line that caused it, and the line can be mended in place. */
export function DeckListing({ deck, refusal, onLine, onWhole }: DeckListingProps): ReactNode {
  return (
    <ol aria-label="Deck" className="max-h-[420px] overflow-auto py-1 font-mono text-sm tracking-[-.03em]">
      {deck.split('\n').map((text, index) => {
        const at = index + 1;
        if (at !== refusal.line) return <li key={at} className="grid grid-cols-[36px_1fr] whitespace-pre"><span className="border-r border-rule bg-film-2 pr-2 text-right leading-6 text-ink-2">{at}</span><span className={classNames('px-3 leading-6', /^\s*[*;]/.test(text) ? 'text-ink-2' : 'text-ink')}>{text || ' '}</span></li>;
        return (
          <li key={at} className="grid grid-cols-[36px_1fr] bg-stop-wash">
            <span className="bg-stop pr-2 text-right leading-9 font-bold text-on-stop">{at}</span>
            <div className="px-3 py-1.5">
              <input aria-label={`Line ${at}`} aria-describedby="deck-refusal" aria-invalid autoFocus value={text} spellCheck={false} autoCapitalize="none" onChange={(event) => onLine(event.target.value)} className="h-8 w-full rounded-key border border-stop bg-film px-2 text-ink max-tablet:h-target max-tablet:text-lg" />
              <div className="mt-1.5 flex items-start gap-2 font-sans text-md tracking-normal">
                <Mark kind="stop" size={16} silent />
                <p id="deck-refusal" role="alert" className="min-w-0 flex-1 text-ink"><span className="text-body font-semibold">Line {at}:</span> {refusal.reason}</p>
                <Button size="small" onClick={onWhole}>Whole deck</Button>
              </div>
            </div>
          </li>
        );
      })}
    </ol>
  );
}
