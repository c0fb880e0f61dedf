import type { Metadata } from 'next';
import { AskPage } from '@/components/review/ask-page';
import { RefusedPage } from '@/components/shell/refused-page';
import { database } from '@/db/client';
import { circuitGate } from '@/lib/access/gates';
import { may } from '@/lib/access/may';
import { pagePerson, passOrNotFound } from '@/lib/http/page-caller';

interface AskPageProps {
  readonly params: Promise<{ id: string; letter: string }>;
}

export async function generateMetadata({ params }: AskPageProps): Promise<Metadata> {
  return { title: `Ask for review of ${(await params).letter}` };
}

export default async function Page({ params }: AskPageProps) {
  const { id, letter } = await params;
  const path = `/circuits/${id}/revisions/${letter}`;
  const access = await passOrNotFound(circuitGate(database(), await pagePerson(`${path}/ask`), id));
  if (!may('ask for review', access.standing)) return <RefusedPage what="Asking for review" href={path} />;
  return <AskPage letter={letter} />;
}
