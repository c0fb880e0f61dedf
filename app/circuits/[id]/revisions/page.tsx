import type { Metadata } from 'next';
import { RevisionsPage } from '@/components/review/revisions-page';

export const metadata: Metadata = { title: 'Revisions' };

export default function Page() {
  return <RevisionsPage />;
}
