import type { ReactNode } from 'react';
import { classNames } from './class-names';

interface StateBoxProps {
  readonly title: ReactNode;
  readonly children?: ReactNode;
  readonly action?: ReactNode;
  readonly failed?: boolean;
}

/** An empty place says the next step and offers it; a failed one says what to do. */
export function StateBox({ title, children, action, failed = false }: StateBoxProps) {
  return (
    <div role={failed ? 'alert' : undefined} className={classNames('border-[1.5px] p-4 text-md leading-normal text-ink-2', failed ? 'border-stop' : 'border-dashed border-edge')}>
      <p className={classNames('mb-0.5 text-body leading-tight font-semibold', failed ? 'text-stop-ink' : 'text-ink')}>{title}</p>
      {children}
      {action ? <div className="mt-2.5">{action}</div> : null}
    </div>
  );
}
