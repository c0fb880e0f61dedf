import type { ReactNode } from 'react';
import { classNames } from '@/components/ui/class-names';
import { BarRule } from './top-bar';

export type Lamp = 'ok' | 'stop' | 'caution' | 'working' | 'off';

const lamps: Readonly<Record<Lamp, string>> = {
  ok: 'bg-signed',
  stop: 'bg-stop',
  caution: 'bg-caution',
  working: 'bg-[linear-gradient(90deg,var(--act)_50%,var(--panel)_50%)]',
  off: 'bg-transparent',
};

/** A panel lamp; what it means always stands beside it. */
export function LampMark({ lamp }: { readonly lamp: Lamp }) {
  return <span aria-hidden="true" className={classNames('mr-2 inline-block size-[9px] rounded-round shadow-[0_0_0_1.5px_var(--panel),0_0_0_2.5px_var(--edge)]', lamps[lamp])} />;
}

interface StatusStripProps {
  readonly lamp: Lamp;
  readonly state: ReactNode;
  readonly notes?: readonly ReactNode[];
  readonly right?: ReactNode;
}

/** The foot of the panel: what state things are in, told in words. */
export function StatusStrip({ lamp, state, notes = [], right }: StatusStripProps) {
  return (
    <footer className="relative z-[2] flex h-7 flex-none items-center gap-3.5 overflow-hidden border-t border-edge bg-panel px-4 text-xs whitespace-nowrap text-silk max-tablet:hidden print:hidden">
      <span className="flex items-center"><LampMark lamp={lamp} />{state}</span>
      {notes.filter(Boolean).map((note, index) => (
        <span key={index} className="contents"><BarRule /><span className="min-w-0 truncate">{note}</span></span>
      ))}
      <span className="flex-1" />
      {right}
    </footer>
  );
}
