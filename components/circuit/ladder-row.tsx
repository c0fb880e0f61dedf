import type { ReactNode } from 'react';
import { Ladder } from '@/components/ladder/ladder';
import type { LadderPoint } from '@/components/ladder/ladder-point';
import type { LadderFlag, LadderSigned } from '@/components/ladder/ladder-state';

interface LadderRowProps {
  readonly block: ReactNode;
  readonly points: readonly LadderPoint[];
  readonly shown: string | null;
  readonly onShow: (name: string) => void;
  readonly signed: LadderSigned;
  readonly flags: readonly LadderFlag[];
  readonly act: ReactNode;
}

/** What is on show, the ladder, and the one next act. */
export function LadderRow({ block, points, shown, onShow, signed, flags, act }: LadderRowProps) {
  return (
    <section aria-label="Hold points" className="groove-b relative z-[3] flex h-20 flex-none items-stretch bg-panel print:hidden">
      {block}
      <div className="flex min-w-0 flex-1 pl-1 max-tablet:pl-0">
        {points.length === 0 ? (
          <p className="self-center px-4 text-md text-silk-2">No power-up plan yet. Without one the sheet is checked as drawn, and nothing can be signed off.</p>
        ) : <Ladder points={points} shown={shown} onShow={onShow} signed={signed} flags={flags} />}
      </div>
      <div className="flex w-[264px] flex-none flex-col justify-center gap-1.5 border-l border-groove px-4 text-xs leading-normal text-silk-2 shadow-[inset_1px_0_0_var(--groove-lit)] max-wide:w-[196px] max-wide:px-3 max-tablet:hidden">{act}</div>
    </section>
  );
}
