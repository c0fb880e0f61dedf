import { classNames } from '@/components/ui/class-names';
import { Icon, type IconName } from '@/components/ui/icon';

const looks = {
  must: 'border-stop bg-stop text-on-stop',
  answered: 'border-act text-act',
  resolved: 'border-signed text-signed-ink',
  open: 'border-act text-act',
  deviation: 'border-dashed border-caution-ink text-caution-ink',
} as const;

/** State of an entry as a small label. */
export function EntryPill({ look, icon, children }: { readonly look: keyof typeof looks; readonly icon?: IconName; readonly children: string }) {
  return (
    <span className={classNames('inline-flex h-[18px] flex-none items-center gap-1 rounded-box border px-1.5 font-cond text-xs leading-none font-semibold tracking-[.03em]', looks[look])}>
      {icon ? <Icon name={icon} className="size-[11px]" /> : null}
      {children}
    </span>
  );
}
