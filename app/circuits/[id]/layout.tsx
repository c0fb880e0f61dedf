import { redirect } from 'next/navigation';
import type { ReactNode } from 'react';
import { CircuitPlaceProvider } from '@/components/circuit/circuit-context';
import { QueryProvider } from '@/components/query/query-provider';
import { database } from '@/db/client';
import { circuitGate } from '@/lib/access/gates';
import { may } from '@/lib/access/may';
import { actions } from '@/lib/access/rights';
import { pageCaller, passOrNotFound } from '@/lib/http/page-caller';
import { benchName } from '@/db/queries/benches';

interface CircuitLayoutProps {
  readonly params: Promise<{ id: string }>;
  readonly children: ReactNode;
}

/** Lets people of the bench and guests of this very circuit through, and tells the pages who reads. */
export default async function CircuitLayout({ params, children }: CircuitLayoutProps) {
  const { id } = await params;
  const caller = await pageCaller();
  if (!caller.person && !caller.link) redirect(`/sign-in?to=${encodeURIComponent(`/circuits/${id}`)}`);
  const access = await passOrNotFound(circuitGate(database(), caller, id));
  const guest = access.standing.role === 'guest';
  const person = guest || !caller.person ? null : { id: caller.person.id, name: caller.person.name, email: caller.person.email };
  const place = {
    circuitId: access.circuit,
    bench: { slug: access.slug, name: await benchName(database(), access.bench) },
    person,
    // Which revision somebody contributed to is told by the revision itself.
    may: actions.filter((action) => may(action, { ...access.standing, contributor: false })),
  };
  return <CircuitPlaceProvider value={place}><QueryProvider>{children}</QueryProvider></CircuitPlaceProvider>;
}
