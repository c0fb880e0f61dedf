import type { ReactNode } from 'react';
import { classNames } from './class-names';

interface KeyOption<Value extends string> {
  readonly value: Value;
  readonly words: ReactNode;
  readonly count?: number;
}

interface KeyGroupProps<Value extends string> {
  readonly label: string;
  readonly value: Value;
  readonly options: readonly KeyOption<Value>[];
  readonly onChange: (value: Value) => void;
}

/** Adjoining keys of which one is down. */
export function KeyGroup<Value extends string>({ label, value, options, onChange }: KeyGroupProps<Value>) {
  return (
    <div role="group" aria-label={label} className="inline-flex max-w-full overflow-x-auto">
      {options.map((option) => (
        <button
          key={option.value}
          type="button"
          aria-pressed={option.value === value}
          onClick={() => onChange(option.value)}
          className={classNames(
            '-ml-px inline-flex h-[30px] flex-none items-center gap-[7px] border border-edge px-[11px] font-cond text-sm leading-none font-semibold tracking-[.05em] uppercase first:ml-0 first:rounded-l-key last:rounded-r-key max-tablet:h-target max-tablet:text-body',
            option.value === value ? 'bg-key-hi shadow-[inset_0_-3px_0_var(--act)]' : 'bg-key hover:bg-key-hi',
          )}
        >
          {option.words}
          {option.count === undefined ? null : <span className="font-mono text-legend font-normal text-silk-2">{option.count}</span>}
        </button>
      ))}
    </div>
  );
}
