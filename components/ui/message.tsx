import type { ReactNode } from 'react';
import { classNames } from './class-names';
import { Icon } from './icon';
import { Mark } from './mark';

type MessageTone = 'stop' | 'caution' | 'advice' | 'ok';

const looks: Readonly<Record<MessageTone, string>> = {
  stop: 'border-stop bg-stop-wash shadow-[inset_4px_0_0_var(--stop)]',
  caution: 'border-caution-ink bg-caution-wash shadow-[inset_4px_0_0_var(--caution)]',
  advice: 'border-ink-2 bg-film-2 shadow-[inset_4px_0_0_var(--ink-2)]',
  ok: 'border-signed bg-signed-wash shadow-[inset_4px_0_0_var(--signed)]',
};

interface MessageProps {
  readonly tone: MessageTone;
  readonly title: ReactNode;
  readonly children?: ReactNode;
  readonly action?: ReactNode;
}

/** What, why and what to do, where it happened. */
export function Message({ tone, title, children, action }: MessageProps) {
  return (
    <div role={tone === 'stop' ? 'alert' : 'status'} className={classNames('grid grid-cols-[22px_1fr_auto] items-start gap-2.5 border py-2.5 pr-3 pl-3.5 text-md leading-normal text-ink', looks[tone])}>
      {tone === 'ok' ? (
        <span className="grid size-5 place-items-center rounded-box bg-signed text-on-signed"><Icon name="check" className="size-3.5" /></span>
      ) : <Mark kind={tone} size={20} silent />}
      <div className="min-w-0">
        <p className="text-body leading-tight font-semibold">{title}</p>
        {children ? <div className="mt-0.5 text-ink-2">{children}</div> : null}
      </div>
      {action}
    </div>
  );
}
