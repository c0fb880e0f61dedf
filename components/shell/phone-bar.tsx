import Link from 'next/link';
import type { ReactNode } from 'react';
import { Icon } from '@/components/ui/icon';

interface PhoneBarProps {
  readonly back?: { readonly href: string; readonly words: string };
  readonly title: string;
  /** True where the page has no other heading at this width. */
  readonly heading?: boolean;
  readonly under?: ReactNode;
  readonly children?: ReactNode;
}

/** The top edge on a phone: back, what this is, one menu. */
export function PhoneBar({ back, title, heading = false, under, children }: PhoneBarProps) {
  return (
    <header className="groove-b relative z-[6] flex h-[54px] flex-none items-center gap-1.5 bg-panel px-1 pl-3.5 has-[>a]:pl-1 print:hidden">
      {back ? (
        <Link href={back.href} aria-label={back.words} className="grid size-target flex-none place-items-center"><Icon name="back" className="size-5" /></Link>
      ) : null}
      <div className="flex min-w-0 flex-1 flex-col leading-tight">
        {heading ? <h1 className="truncate text-lg leading-tight font-semibold">{title}</h1> : <p className="truncate text-lg leading-tight font-semibold">{title}</p>}
        {under ? <p className="truncate text-sm text-silk-2">{under}</p> : null}
      </div>
      {children}
    </header>
  );
}
