import type { ComponentProps } from 'react';
import { classNames } from './class-names';

interface SelectProps<Value extends string> extends Omit<ComponentProps<'select'>, 'onChange' | 'value'> {
  readonly label: string;
  readonly value: Value;
  readonly options: readonly { readonly value: Value; readonly words: string }[];
  readonly onChange: (value: Value) => void;
}

/** The browser's own list behind a key's face; the name stands in front of the choice. */
export function Select<Value extends string>({ label, value, options, onChange, className, ...rest }: SelectProps<Value>) {
  return (
    <label className={classNames('inline-flex h-[30px] items-center gap-1.5 rounded-key border border-edge bg-key pl-2.5 font-cond text-sm leading-none font-semibold tracking-[.05em] text-silk uppercase hover:bg-key-hi has-[:focus-visible]:outline-2 has-[:focus-visible]:outline-offset-2 has-[:focus-visible]:outline-act max-tablet:h-target', className)}>
      <span>{label}:</span>
      <select {...rest} value={value} onChange={(event) => onChange(event.target.value as Value)} className="h-full cursor-pointer bg-key pr-2 uppercase outline-none [&>option]:bg-film [&>option]:text-ink">
        {options.map((option) => <option key={option.value} value={option.value}>{option.words}</option>)}
      </select>
    </label>
  );
}
