'use client';
import { artOf } from '@/components/drawing/part-view';
import { SymbolView } from '@/components/drawing/symbol-view';
import { classNames } from '@/components/ui/class-names';

/** Which of the two drawings in use the sheet shows its resistors in: a way of looking, kept for this browser. */
export function ResistorForm({ zigzag, onZigzag }: { readonly zigzag: boolean; readonly onZigzag: (zigzag: boolean) => void }) {
  return (
    <fieldset className="groove-t flex-none px-2.5 pt-2 pb-2.5">
      <legend className="sr-only">Resistor form</legend>
      <span aria-hidden="true" className="silk mb-1.5 block text-silk-2">Resistor form</span>
      <div className="flex">
        {([false, true] as const).map((form) => (
          <button key={String(form)} type="button" aria-label={form ? 'Zigzag' : 'Rectangle'} aria-pressed={zigzag === form} onClick={() => onZigzag(form)} className={classNames('-ml-px grid h-[30px] flex-1 place-items-center border border-edge first:ml-0 first:rounded-l-key last:rounded-r-key', zigzag === form ? 'bg-key-hi shadow-[inset_0_-3px_0_var(--act)]' : 'bg-key hover:bg-key-hi')}>
            <svg width="40" height="12" viewBox="-30 -8 60 16" aria-hidden="true" className="[--film:var(--key)] [--ink:var(--silk)]"><SymbolView art={artOf('resistor', form)} /></svg>
          </button>
        ))}
      </div>
    </fieldset>
  );
}
