import type { ComponentProps, ReactNode } from 'react';
import { classNames } from './class-names';

interface FilterChipProps extends Omit<ComponentProps<'button'>, 'children'> {
  readonly pressed: boolean;
  readonly count: number;
  readonly mark?: ReactNode;
  readonly words: string;
  /** On a phone the words may go; the mark and the spoken name stay. */
  readonly compact?: boolean;
}

/** A filter with its count. */
export function FilterChip({ pressed, count, mark, words, compact = false, className, ...rest }: FilterChipProps) {
  return (
    <button
      type="button"
      aria-pressed={pressed}
      aria-label={`${words}, ${count}`}
      {...rest}
      className={classNames(
        'inline-flex h-6 flex-none items-center gap-1 rounded-box border px-[5px] font-cond text-xs leading-none font-semibold whitespace-nowrap max-tablet:h-target max-tablet:min-w-target max-tablet:gap-1.5 max-tablet:px-2.5 max-tablet:text-body',
        pressed ? 'border-ink bg-ink text-film' : 'border-edge bg-film text-ink hover:bg-film-2',
        className,
      )}
    >
      {mark}
      <span className={compact ? 'max-tablet:sr-only' : undefined}>{words}</span>
      <span className="font-mono text-legend font-normal max-tablet:text-md">{count}</span>
    </button>
  );
}
