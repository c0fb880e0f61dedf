import { useId, type ComponentProps, type ReactNode } from 'react';
import { classNames } from './class-names';
import { Mark } from './mark';

const box = 'w-full rounded-key border bg-film px-3 text-ink max-tablet:min-h-target max-tablet:text-lg';

function boxState(error: ReactNode): string {
  return error ? 'border-stop bg-stop-wash shadow-[inset_4px_0_0_var(--stop)] pl-4' : 'border-edge';
}

interface FieldFrameProps {
  readonly label: ReactNode;
  readonly hint?: ReactNode;
  readonly error?: ReactNode;
  readonly aside?: ReactNode;
  readonly children: (ids: { readonly id: string; readonly describedBy: string | undefined }) => ReactNode;
}

/** Legend above, what is wrong below, where it happened. */
export function FieldFrame({ label, hint, error, aside, children }: FieldFrameProps) {
  const id = useId();
  const note = `${id}-note`;
  const described = error || hint ? note : undefined;
  return (
    <div className="min-w-0">
      <div className="mb-1.5 flex items-baseline justify-between gap-3">
        <label htmlFor={id} className="silk text-ink-2">{label}</label>
        {aside}
      </div>
      {children({ id, describedBy: described })}
      {error ? (
        <p id={note} role="alert" className="mt-1.5 flex gap-1.5 text-sm leading-[1.32] text-stop-ink">
          <Mark kind="stop" size={16} silent />
          <span>{error}</span>
        </p>
      ) : hint ? <p id={note} className="mt-1.5 text-sm leading-[1.32] text-ink-2">{hint}</p> : null}
    </div>
  );
}

type Framed = Pick<FieldFrameProps, 'label' | 'hint' | 'error' | 'aside'>;

/** One line of text. */
export function TextField({ label, hint, error, aside, className, ...rest }: Framed & Omit<ComponentProps<'input'>, 'id'>) {
  return (
    <FieldFrame label={label} hint={hint} error={error} aside={aside}>
      {({ id, describedBy }) => (
        <input {...rest} id={id} aria-describedby={describedBy} aria-invalid={error ? true : undefined} className={classNames(box, 'h-9 text-md', boxState(error), className)} />
      )}
    </FieldFrame>
  );
}

/** Several lines of text. */
export function TextArea({ label, hint, error, aside, className, ...rest }: Framed & Omit<ComponentProps<'textarea'>, 'id'>) {
  return (
    <FieldFrame label={label} hint={hint} error={error} aside={aside}>
      {({ id, describedBy }) => (
        <textarea {...rest} id={id} aria-describedby={describedBy} aria-invalid={error ? true : undefined} className={classNames(box, 'block resize-y py-2 text-md leading-normal', boxState(error), className)} />
      )}
    </FieldFrame>
  );
}
