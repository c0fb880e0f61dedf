import type { ReactNode } from 'react';
import { SheetFrame } from '@/components/ui/sheet-frame';
import { ThemeToggle } from './theme-toggle';
import { TopBar } from './top-bar';

interface PlainPageProps {
  /** Status or sheet number, in the title block. */
  readonly code: string;
  readonly title: string;
  readonly children: ReactNode;
  readonly actions: ReactNode;
}

/** A page that says one thing: an empty sheet with a title block. */
export function PlainPage({ code, title, children, actions }: PlainPageProps) {
  return (
    <div className="flex min-h-full flex-col">
      <TopBar><ThemeToggle /></TopBar>
      <main className="flex flex-1 flex-col bg-film text-ink">
        <SheetFrame columns={8} rows={5}>
          <div className="mt-auto -mr-px -mb-px w-[522px] self-end border-[1.5px] border-ink bg-film max-tablet:mx-0 max-tablet:mt-0 max-tablet:w-full max-tablet:border-x-0">
            <div className="px-5 pt-[22px] pb-[18px]">
              <h1 className="font-cond text-[38px] leading-[1.05] font-semibold tracking-[.01em]">{title}</h1>
              <div className="mt-2 text-body text-ink-2">{children}</div>
            </div>
            <div className="flex flex-wrap gap-2.5 border-t border-ink px-5 py-3.5">{actions}</div>
            <div className="flex min-h-11 border-t border-ink">
              <div className="flex-[2] px-5 py-[7px]"><p className="silk text-ink-2">Title</p><p className="text-body font-medium">{title}</p></div>
              <div className="flex-1 border-l border-ink px-5 py-[7px]"><p className="silk text-ink-2">Answer</p><p className="text-body font-medium">{code}</p></div>
            </div>
          </div>
        </SheetFrame>
      </main>
    </div>
  );
}
