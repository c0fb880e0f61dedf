import { counted } from '@/components/ui/counted';
import Link from 'next/link';
import { ThemeToggle } from '@/components/shell/theme-toggle';
import { BarRule, TopBar } from '@/components/shell/top-bar';
import { ButtonLink } from '@/components/ui/button-link';
import type { Sheet } from '@/lib/document/records';
import { marginEntries } from '@/components/margin/margin-entry';
import type { LandingPicture } from './landing-picture';
import { ProductPicture } from './product-picture';

const steps: readonly { readonly name: string; readonly words: string }[] = [
  { name: 'Draw', words: 'Draw the stage, or bring in a netlist. Say at which voltages it will be powered.' },
  { name: 'Check', words: 'Rules and a circuit engine look for floating gates, overstress and lifted leads, at every voltage of the plan.' },
  { name: 'Discuss', words: 'Peers write in the margin, beside the part, while you draw.' },
  { name: 'Sign off', words: 'A mentor signs one revision up to one voltage. An edit needs a new sign-off.' },
];

interface LandingPageProps {
  readonly sheet: Sheet;
  readonly check: LandingPicture;
  /** Where the demo circuit opens, read only; null where nothing is seeded. */
  readonly demoHref: string | null;
  readonly signedIn: boolean;
}

/** What it is, with the real product in a picture. */
export function LandingPage({ sheet, check, demoHref, signedIn }: LandingPageProps) {
  const stops = marginEntries(check.findings, []).filter((entry) => entry.kind === 'stop').length;
  const start = signedIn ? { href: '/benches', words: 'To your bench' } : { href: '/sign-in', words: 'Sign in' };
  return (
    <div className="flex min-h-full flex-col">
      <TopBar>
        <Link href="#how" className="silk flex min-h-8 items-center px-3 text-sm hover:underline max-tablet:hidden">How it works</Link>
        <BarRule />
        <ThemeToggle />
        <ButtonLink href={start.href} tone="primary">{start.words}</ButtonLink>
      </TopBar>
      <main className="mx-auto flex w-full max-w-[1440px] flex-1 flex-col px-14 max-wide:px-8 max-tablet:px-4">
        <div className="grid grid-cols-[minmax(0,1fr)_780px] items-start gap-10 pt-10 max-wide:grid-cols-1 max-tablet:pt-6">
          <div className="pt-7 max-wide:max-w-[640px] max-tablet:pt-0">
            <h1 className="font-cond text-[76px] leading-[.97] font-semibold tracking-[-.005em] text-silk max-tablet:text-[52px]">Review it before you power it.</h1>
            <p className="mt-6 mb-6.5 text-[17.5px] leading-[1.46] text-silk-2">A shared review bench for power-switching circuits. Post the MOSFET stage, have it checked, and have one revision of it signed off up to one voltage by somebody who has done it before.</p>
            <div className="flex flex-wrap gap-2.5">
              <ButtonLink href={start.href} tone="primary" size="large">{start.words}</ButtonLink>
              {demoHref ? <ButtonLink href={demoHref} prefetch={false} size="large">Open this circuit</ButtonLink> : null}
            </div>
          </div>
          <figure>
            <ProductPicture sheet={sheet} check={check} />
            <figcaption className="mt-2 text-sm text-silk-2">{sheet.title}: {check.checks} checks, {counted(stops, 'stop')}. {demoHref ? <Link href={demoHref} prefetch={false} className="text-act underline underline-offset-[3px]">Open this circuit</Link> : null}</figcaption>
          </figure>
        </div>
        <ol id="how" className="mt-10 grid grid-cols-4 gap-[26px] max-wide:grid-cols-2 max-tablet:grid-cols-1">
          {steps.map((step, index) => (
            <li key={step.name} className="border-t-[1.5px] border-silk pt-3">
              <h2 className="flex items-center gap-2.5 font-cond text-[22px] leading-tight font-semibold"><span className="grid size-[26px] place-items-center border-[1.5px] border-silk bg-film text-body font-bold text-ink">{index + 1}</span>{step.name}</h2>
              <p className="mt-1.5 text-md leading-[1.4] text-silk-2">{step.words}</p>
            </li>
          ))}
        </ol>
        <p className="groove-t mt-auto py-3.5 text-sm text-silk-2 max-wide:mt-10">A sign-off is a peer’s review. It is not permission in law and does not make mains work safe: follow your local licensed-practice rules.</p>
      </main>
    </div>
  );
}
