import type { ReactNode } from 'react';
import { classNames } from '@/components/ui/class-names';
import type { EntryKind } from './margin-entry';

const tones: Readonly<Record<EntryKind, string>> = {
  stop: 'text-stop-ink border-stop',
  caution: 'text-caution-ink border-caution-ink',
  advice: 'text-ink border-ink-2',
  undetermined: 'text-act border-act',
  note: 'text-act border-act',
};

interface EntryHeadProps {
  readonly kind: EntryKind;
  readonly mark: ReactNode;
  readonly words: string;
  /** One line of the entry while it is folded. */
  readonly folded?: ReactNode;
  readonly pills?: ReactNode;
  readonly right: ReactNode;
  readonly locator?: ReactNode;
  readonly selected: boolean;
  readonly quiet?: boolean;
  readonly lost?: boolean;
  readonly onSelect: () => void;
}

/** Mark, name and where from: the line that the leader runs into. The whole of it selects the entry. */
export function EntryHead({ kind, mark, words, folded, pills, right, locator, selected, quiet = false, lost = false, onSelect }: EntryHeadProps) {
  return (
    <div className={classNames('-ml-3 flex h-[26px] items-center gap-[7px] border-b pr-1.5 pl-3 max-wide:h-11', quiet ? 'border-rule text-ink-2' : tones[kind], lost && 'border-dashed', selected && 'border-b-2')}>
      <h3 className="flex min-w-0 flex-1 items-center">
        <button type="button" onClick={onSelect} aria-expanded={selected} className="flex h-[26px] min-w-0 flex-1 items-center gap-[7px] text-left font-cond text-sm leading-none font-semibold tracking-[.04em] max-wide:h-11 max-tablet:text-body">
          {mark}
          <span className="flex-none uppercase">{words}</span>
          {folded ? <span className="min-w-0 truncate font-sans text-sm font-normal tracking-normal text-ink">{folded}</span> : null}
        </button>
      </h3>
      {pills}
      <span className="flex-none font-mono text-xs leading-none tracking-[-.02em] text-ink-2">{right}</span>
      {locator}
    </div>
  );
}
