import type { Metadata } from 'next';
import Link from 'next/link';
import { redirect } from 'next/navigation';
import { AccountMenu } from '@/components/shell/account-menu';
import { ThemeToggle } from '@/components/shell/theme-toggle';
import { TopBar } from '@/components/shell/top-bar';
import { StateBox } from '@/components/ui/state-box';
import { database } from '@/db/client';
import { ownBenches } from '@/db/queries/people';
import { pagePerson } from '@/lib/http/page-caller';

export const metadata: Metadata = { title: 'Your benches' };

/** Whoever has one bench goes straight to it. */
export default async function BenchesPage() {
  const { person } = await pagePerson('/benches');
  const benches = await ownBenches(database(), person.id);
  if (benches.length === 1 && benches[0]) redirect(`/benches/${benches[0].slug}`);
  return (
    <div className="flex min-h-full flex-col">
      <TopBar brandHref="/benches"><ThemeToggle /><AccountMenu person={person} /></TopBar>
      <main className="flex-1 bg-film p-8 text-ink max-tablet:p-4">
        <h1 className="mb-4 font-cond text-2xl font-semibold">Your benches</h1>
        {benches.length === 0 ? <div className="max-w-[520px]"><StateBox title="You are in no bench yet">Ask the steward of a bench to invite you: {person.email}.</StateBox></div> : (
          <ul className="max-w-[520px] border-[1.5px] border-ink">
            {benches.map((bench) => (
              <li key={bench.slug} className="border-b border-rule last:border-0">
                <Link href={`/benches/${bench.slug}`} className="flex min-h-14 items-center justify-between px-4 text-body font-semibold hover:bg-film-2">{bench.name}<span className="text-sm font-normal text-ink-2">{bench.role}</span></Link>
              </li>
            ))}
          </ul>
        )}
      </main>
    </div>
  );
}
