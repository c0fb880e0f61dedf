import type { ReactNode } from 'react';

interface SheetFrameProps {
  readonly columns: number;
  readonly rows: number;
  readonly children: ReactNode;
}

/** A drafting sheet's border with zone numbers above and letters at the left, at any size. */
export function SheetFrame({ columns, rows, children }: SheetFrameProps) {
  const zone = 'font-cond text-legend font-medium text-ink-2';
  return (
    <div className="relative flex flex-1 flex-col pt-7 pr-8 pb-6 pl-8 max-tablet:p-0">
      <div aria-hidden="true" className="absolute top-[15px] right-8 left-8 flex h-[13px] max-tablet:hidden">
        {Array.from({ length: columns }, (_, index) => <span key={index} className={`${zone} flex-1 text-center leading-[9px] not-last:border-r not-last:border-ink`}>{index + 1}</span>)}
      </div>
      <div aria-hidden="true" className="absolute top-7 bottom-6 left-[18px] flex w-[14px] flex-col max-tablet:hidden">
        {Array.from({ length: rows }, (_, index) => <span key={index} className={`${zone} grid flex-1 place-items-center not-last:border-b not-last:border-ink`}>{String.fromCharCode(65 + index)}</span>)}
      </div>
      <div className="drafting-grid relative flex flex-1 flex-col border-[1.5px] border-ink max-tablet:border-0">{children}</div>
    </div>
  );
}
