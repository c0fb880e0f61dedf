import type { Metadata } from 'next';
import { PostForm } from '@/components/post/post-form';
import { BenchBar } from '@/components/shell/bench-bar';
import { RefusedPage } from '@/components/shell/refused-page';
import { StatusStrip } from '@/components/shell/status-strip';
import { ButtonLink } from '@/components/ui/button-link';
import { database } from '@/db/client';
import { benchGate } from '@/lib/access/gates';
import { may } from '@/lib/access/may';
import { pagePerson, passOrNotFound } from '@/lib/http/page-caller';

interface NewCircuitPageProps {
  readonly params: Promise<{ bench: string }>;
  readonly searchParams: Promise<{ from?: string }>;
}

export const metadata: Metadata = { title: 'New circuit' };

export default async function NewCircuitPage({ params, searchParams }: NewCircuitPageProps) {
  const { bench: slug } = await params;
  const { from } = await searchParams;
  const caller = await pagePerson(`/benches/${slug}/new`);
  const bench = await passOrNotFound(benchGate(database(), caller, slug));
  if (!may('post a circuit', bench.standing)) return <RefusedPage what="Posting a circuit" href={`/benches/${slug}`} />;
  const back = { href: `/benches/${slug}`, words: 'Back to the bench' };
  return (
    <div className="flex h-full flex-col overflow-hidden">
      <BenchBar bench={bench} person={caller.person} title="New circuit" back={back} />
      <main className="flex min-h-0 flex-1 flex-col">
        <div className="flex h-[78px] flex-none items-center border-b border-edge bg-panel px-5 max-tablet:hidden">
          <div className="flex-1">
            <p className="silk text-silk-2 font-medium">{bench.name}</p>
            <h1 className="font-cond text-[27px] leading-[1.15] font-semibold tracking-[.015em]">New circuit</h1>
          </div>
          <ButtonLink href={back.href} size="large">{back.words}</ButtonLink>
        </div>
        <div className="min-h-0 flex-1 overflow-y-auto bg-film"><PostForm bench={slug} from={from === 'deck' ? 'deck' : 'empty'} maker={caller.person.name} /></div>
      </main>
      <StatusStrip lamp="off" state="Not posted yet" />
    </div>
  );
}
