import type { Metadata } from 'next';
import { BenchHome } from '@/components/bench/bench-home';
import { QueryProvider } from '@/components/query/query-provider';
import { BenchBar } from '@/components/shell/bench-bar';
import { StatusStrip } from '@/components/shell/status-strip';
import { ButtonLink } from '@/components/ui/button-link';
import { database } from '@/db/client';
import { benchGate } from '@/lib/access/gates';
import { may } from '@/lib/access/may';
import { pagePerson, passOrNotFound } from '@/lib/http/page-caller';

interface BenchPageProps {
  readonly params: Promise<{ bench: string }>;
}

export const metadata: Metadata = { title: 'Bench' };

export default async function BenchPage({ params }: BenchPageProps) {
  const { bench: slug } = await params;
  const caller = await pagePerson(`/benches/${slug}`);
  const bench = await passOrNotFound(benchGate(database(), caller, slug));
  return (
    <div className="flex h-full flex-col overflow-hidden">
      <BenchBar bench={bench} person={caller.person} />
      <main className="flex min-h-0 flex-1 flex-col">
        <QueryProvider><BenchHome bench={slug} name={bench.name} person={caller.person.id} mayPost={may('post a circuit', bench.standing)} /></QueryProvider>
        {may('post a circuit', bench.standing) ? (
          <div className="flex-none border-t border-edge bg-panel p-2.5 tablet:hidden"><ButtonLink href={`/benches/${slug}/new`} tone="primary" size="large" icon="plus" className="w-full">New circuit</ButtonLink></div>
        ) : null}
      </main>
      <StatusStrip lamp="ok" state={`You are a ${bench.standing.role} here`} right="A sign-off is a peer’s review, not permission in law" />
    </div>
  );
}
