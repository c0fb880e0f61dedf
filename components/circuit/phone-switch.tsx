import { classNames } from '@/components/ui/class-names';

export type PhonePane = 'drawing' | 'margin';

/** The foot of a phone: the drawing or its margin. */
export function PhoneSwitch({ pane, count, onPane }: { readonly pane: PhonePane; readonly count: number; readonly onPane: (pane: PhonePane) => void }) {
  const key = (value: PhonePane, words: string, number?: number) => (
    <button type="button" aria-pressed={pane === value} onClick={() => onPane(value)} className={classNames('flex h-11 flex-1 items-center justify-center gap-2 rounded-key border border-edge font-cond text-body font-semibold tracking-[.05em] uppercase', pane === value ? 'bg-key-hi shadow-[inset_0_-3px_0_var(--act)]' : 'bg-key')}>
      {words}{number === undefined ? null : <span className="font-mono text-sm font-normal text-silk-2">{number}</span>}
    </button>
  );
  return <nav aria-label="Drawing or margin" className="flex h-[62px] flex-none items-center gap-2 border-t border-edge bg-panel px-3 tablet:hidden print:hidden">{key('drawing', 'Drawing')}{key('margin', 'Margin', count)}</nav>;
}
