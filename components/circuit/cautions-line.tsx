'use client';
import { useState } from 'react';
import { voltsWords } from '@/components/ladder/plan-words';
import { HatchTag } from '@/components/ui/hatch-tag';

const cautions: readonly string[] = [
  'Isolate: an isolated supply, and nothing of the circuit on earth that need not be.',
  'Limit current: set the limit before the output goes on.',
  'Discharge and prove dead: short the capacitors through a resistor, then measure, each time.',
  'One hand; never alone; somebody who knows where the switch is.',
  'A fuse in the supply lead, an enclosure over what is live.',
  'Mains and stored energy kill. Local codes and licensed practice come first.',
];

/** One line under the ladder while the voltage shown is above the touch-safe limit. */
export function CautionsLine({ volts }: { readonly volts: number }) {
  const [all, setAll] = useState(false);
  return (
    <section aria-label="Cautions" className="relative z-[3] flex-none border-y border-ink bg-film text-xs leading-tight text-ink">
      <div className="flex min-h-7 items-center gap-3 px-4 max-tablet:min-h-[46px] max-tablet:gap-2.5 max-tablet:pr-0 max-tablet:pl-3 max-tablet:text-sm">
        <HatchTag className="max-tablet:w-[22px]" />
        <p className="min-w-0 flex-1"><b className="font-mono font-bold tracking-[-.03em]">{voltsWords(volts)}</b>: isolate, limit current, discharge and prove dead, one hand, never alone.<span className="max-tablet:hidden"> Local rules and licensed practice come first.</span></p>
        <button type="button" aria-expanded={all} onClick={() => setAll(!all)} className="min-h-6 text-act underline underline-offset-[3px] max-tablet:min-h-target max-tablet:min-w-[52px]">{all ? 'Fewer' : <>All<span className="max-tablet:sr-only"> cautions</span></>}</button>
      </div>
      {all ? <ul className="list-disc space-y-0.5 pr-4 pb-2 pl-[78px] text-sm max-tablet:pl-9">{cautions.map((caution) => <li key={caution}>{caution}</li>)}</ul> : null}
    </section>
  );
}
