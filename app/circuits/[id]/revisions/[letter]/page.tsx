import type { Metadata } from 'next';
import { RevisionPage } from '@/components/review/revision-page';

interface RevisionPageProps {
  readonly params: Promise<{ letter: string }>;
}

export async function generateMetadata({ params }: RevisionPageProps): Promise<Metadata> {
  return { title: `Revision ${(await params).letter}` };
}

export default async function Page({ params }: RevisionPageProps) {
  return <RevisionPage letter={(await params).letter} />;
}
