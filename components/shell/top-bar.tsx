import Link from 'next/link';
import type { ReactNode } from 'react';
import { Brand } from './brand';

export function BarRule() {
  return <span aria-hidden="true" className="my-[9px] w-px self-stretch bg-groove shadow-[1px_0_0_var(--groove-lit)] max-tablet:hidden" />;
}

/** Where one is: legend above, name below. */
export function Crumb({ legend, name, href }: { readonly legend: string; readonly name: string; readonly href?: string }) {
  return (
    <div className="flex min-w-0 flex-col gap-0.5">
      <span className="silk text-silk-2 font-medium leading-none">{legend}</span>
      {href ? <Link href={href} className="truncate text-body leading-[1.15] font-medium hover:underline">{name}</Link> : <span className="truncate text-body leading-[1.15] font-medium">{name}</span>}
    </div>
  );
}

interface TopBarProps {
  readonly brandHref?: string;
  readonly crumbs?: ReactNode;
  readonly children?: ReactNode;
}

/** The top edge of the front panel, at tablet width and above. */
export function TopBar({ brandHref, crumbs, children }: TopBarProps) {
  return (
    <header className="groove-b relative z-[6] flex h-12 flex-none items-center gap-3.5 bg-panel px-4 print:hidden">
      <Brand href={brandHref} />
      {crumbs}
      <span className="flex-1" />
      {children}
    </header>
  );
}
