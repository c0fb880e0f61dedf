import type { Metadata } from 'next';
import { SignOffPage } from '@/components/review/sign-off-page';
import { RefusedPage } from '@/components/shell/refused-page';
import { database } from '@/db/client';
import { circuitGate } from '@/lib/access/gates';
import { pagePerson, passOrNotFound } from '@/lib/http/page-caller';

interface SignPageProps {
  readonly params: Promise<{ id: string; letter: string }>;
}

export async function generateMetadata({ params }: SignPageProps): Promise<Metadata> {
  return { title: `Sign-off, revision ${(await params).letter}` };
}

export default async function Page({ params }: SignPageProps) {
  const { id, letter } = await params;
  const path = `/circuits/${id}/revisions/${letter}`;
  const access = await passOrNotFound(circuitGate(database(), await pagePerson(`${path}/sign`), id));
  if (access.standing.role === 'guest') return <RefusedPage what="Signing off" href={path} />;
  return <SignOffPage letter={letter} />;
}
