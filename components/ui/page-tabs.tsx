'use client';
import Link from 'next/link';
import type { ReactNode } from 'react';
import { classNames } from './class-names';

export interface PageTab {
  readonly href: string;
  readonly words: string;
  readonly count?: ReactNode;
  readonly current: boolean;
}

/** The pages of one thing, as tabs of a folder. Each is a link. */
export function PageTabs({ label, tabs, tools }: { readonly label: string; readonly tabs: readonly PageTab[]; readonly tools?: ReactNode }) {
  return (
    <div className="relative z-[2] flex h-[38px] flex-none items-end gap-0.5 border-b border-edge bg-panel pr-4 pl-3 max-tablet:h-12 max-tablet:px-1.5">
      <nav aria-label={label} className="flex h-full items-end gap-0.5 overflow-x-auto">
        {tabs.map((tab) => (
          <Link
            key={tab.href}
            href={tab.href}
            aria-current={tab.current ? 'page' : undefined}
            className={classNames(
              'relative -mb-px flex h-[33px] flex-none items-center gap-[7px] rounded-t-key border border-b-0 px-3 font-cond text-body leading-none font-semibold tracking-[.04em] max-tablet:h-target',
              tab.current ? 'z-[4] border-edge bg-film text-ink shadow-[inset_0_3px_0_var(--ink)]' : 'border-transparent text-silk hover:bg-key',
            )}
          >
            {tab.words}
            {tab.count === undefined ? null : <span className="font-mono text-legend font-normal text-silk-2">{tab.count}</span>}
          </Link>
        ))}
      </nav>
      {tools ? <div className="ml-auto flex h-full flex-none items-center gap-2">{tools}</div> : null}
    </div>
  );
}
