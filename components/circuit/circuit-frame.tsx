'use client';
import type { ReactNode } from 'react';
import { AccountMenu } from '@/components/shell/account-menu';
import { PhoneBar } from '@/components/shell/phone-bar';
import { ThemeToggle } from '@/components/shell/theme-toggle';
import { BarRule, Crumb, TopBar } from '@/components/shell/top-bar';
import { ButtonLink } from '@/components/ui/button-link';
import { Icon } from '@/components/ui/icon';
import { PageTabs } from '@/components/ui/page-tabs';
import { useCircuitPlace } from './circuit-context';

interface CircuitFrameProps {
  readonly title: string;
  /** What is on show, on a phone: 'Draft after B, 1 change'. */
  readonly under: string;
  readonly tab: 'sheet' | 'revisions';
  readonly letters: readonly string[];
  readonly people?: ReactNode;
  readonly ladder?: ReactNode;
  readonly cautions?: ReactNode;
  readonly tools?: ReactNode;
  readonly status?: ReactNode;
  readonly foot?: ReactNode;
  readonly back?: { readonly href: string; readonly words: string };
  readonly children: ReactNode;
}

/** Header, ladder, cautions, tabs, work area and status strip of every page of a circuit. A page that is not built has no tab. */
export function CircuitFrame({ title, under, tab, letters, people, ladder, cautions, tools, status, foot, back, children }: CircuitFrameProps) {
  const { circuitId, bench, person } = useCircuitPlace();
  const tabs = [
    { href: `/circuits/${circuitId}`, words: 'Sheet', current: tab === 'sheet' },
    { href: `/circuits/${circuitId}/revisions`, words: 'Revisions', count: letters.length === 0 ? undefined : [...letters].reverse().slice(-6).join(' '), current: tab === 'revisions' },
  ];
  return (
    <div className="flex h-dvh flex-col overflow-hidden print:block print:h-auto print:overflow-visible">
      <div className="max-tablet:hidden">
        <TopBar brandHref={person ? `/benches/${bench.slug}` : '/'} crumbs={<><BarRule /><Crumb legend="Bench" name={bench.name} href={person ? `/benches/${bench.slug}` : undefined} /><BarRule /><Crumb legend="Circuit" name={title} /></>}>
          {people}
          {person ? null : <><span className="silk text-silk-2 inline-flex items-center gap-2 font-medium"><Icon name="lock" />Guest link, read only</span><BarRule /><ButtonLink href={`/sign-in?to=/circuits/${circuitId}`} tone="primary">Sign in</ButtonLink></>}
          <ThemeToggle />
          {person ? <AccountMenu person={person} /> : null}
        </TopBar>
      </div>
      <div className="tablet:hidden">
        <PhoneBar back={back ?? (person ? { href: `/benches/${bench.slug}`, words: 'Back to the bench' } : undefined)} title={title} under={under}>
          {people}
          {person ? <AccountMenu person={person} phone /> : <ButtonLink href={`/sign-in?to=/circuits/${circuitId}`} tone="primary">Sign in</ButtonLink>}
        </PhoneBar>
      </div>
      {ladder}
      {cautions}
      <PageTabs label="Circuit pages" tabs={tabs} tools={tools} />
      <main className="relative flex min-h-0 flex-1 print:block">
        <h1 className="sr-only">{title}, {under}</h1>
        {children}
      </main>
      {foot}
      {status}
    </div>
  );
}
