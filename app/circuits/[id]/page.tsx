import type { Metadata } from 'next';
import { GuestSheetPage } from '@/components/circuit/guest-sheet-page';
import { SheetPage } from '@/components/circuit/sheet-page';
import { database } from '@/db/client';
import { circuitGate } from '@/lib/access/gates';
import { pageCaller, passOrNotFound } from '@/lib/http/page-caller';

interface SheetPageProps {
  readonly params: Promise<{ id: string }>;
}

export const metadata: Metadata = { title: 'Sheet' };

/** People of the bench get the live sheet; a guest the newest revision, as it was cut. */
export default async function Page({ params }: SheetPageProps) {
  const access = await passOrNotFound(circuitGate(database(), await pageCaller(), (await params).id));
  return access.standing.role === 'guest' ? <GuestSheetPage /> : <SheetPage />;
}
