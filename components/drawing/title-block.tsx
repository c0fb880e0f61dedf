import type { ReactNode } from 'react';

export interface TitleCell {
  readonly legend: string;
  readonly value: ReactNode;
  readonly wide?: boolean;
  readonly strong?: boolean;
}

/** The foot of the drawing: who drew, reviewed and signed what. */
export function TitleBlock({ cells }: { readonly cells: readonly TitleCell[] }) {
  return (
    <dl className="flex h-9 flex-none border-[1.5px] border-t border-ink bg-film text-ink max-tablet:hidden print:flex">
      {cells.map((cell) => (
        <div key={cell.legend} className={`min-w-0 border-l border-ink px-2 pt-[3px] first:border-l-0 ${cell.wide ? 'flex-[3]' : 'flex-1'}`}>
          <dt className="silk leading-[1.1] text-ink-2">{cell.legend}</dt>
          <dd className={`truncate leading-tight ${cell.strong ? 'font-mono text-sm font-bold' : 'text-sm'}`}>{cell.value}</dd>
        </div>
      ))}
    </dl>
  );
}
