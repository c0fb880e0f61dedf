import type { ComponentProps, ReactNode } from 'react';
import { classNames } from './class-names';

type ChoiceProps = Omit<ComponentProps<'input'>, 'type' | 'children'> & { readonly children: ReactNode };

const row = 'flex min-h-[26px] items-start gap-2.5 text-md leading-normal text-ink has-[:disabled]:text-ink-2 max-tablet:min-h-target max-tablet:items-center';
const mark = 'mt-px grid size-[18px] flex-none appearance-none place-items-center border-[1.5px] border-ink bg-film disabled:border-dashed disabled:border-ink-3';

/** A tick box whose words are its label. */
export function Checkbox({ children, className, ...rest }: ChoiceProps) {
  return (
    <label className={classNames(row, className)}>
      <input {...rest} type="checkbox" className={classNames(mark, 'checked:tick-mark')} />
      <span className="min-w-0">{children}</span>
    </label>
  );
}

/** One of several. */
export function Radio({ children, className, ...rest }: ChoiceProps) {
  return (
    <label className={classNames(row, className)}>
      <input {...rest} type="radio" className={classNames(mark, 'rounded-round checked:border-act checked:bg-[radial-gradient(circle,var(--act)_4px,transparent_4.5px)]')} />
      <span className="min-w-0">{children}</span>
    </label>
  );
}
