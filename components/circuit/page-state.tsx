'use client';
import type { ReactNode } from 'react';
import { wordsOf } from '@/components/query/api';
import { Button } from '@/components/ui/button';
import { Skeleton } from '@/components/ui/skeleton';
import { StateBox } from '@/components/ui/state-box';

/** While the circuit comes, and when it does not: the frame keeps its final layout. */
export function CircuitLoading({ error, onRetry }: { readonly error: unknown; readonly onRetry: () => void }): ReactNode {
  if (error) {
    const { title, detail } = wordsOf(error);
    return (
      <main className="grid h-dvh place-items-center bg-film p-6"><div className="max-w-[480px]"><StateBox failed title={title} action={<Button icon="retry" onClick={onRetry}>Try again</Button>}>The circuit did not load. {detail}</StateBox></div></main>
    );
  }
  return (
    <div aria-busy="true" className="flex h-dvh flex-col">
      <p role="status" className="sr-only">Loading the circuit</p>
      <div className="groove-b h-12 bg-panel max-tablet:h-[54px]" />
      <div className="groove-b flex h-20 items-center gap-6 bg-panel px-4"><Skeleton className="h-[46px]! w-14" /><Skeleton className="w-40" /><Skeleton className="h-2.5! flex-1" /><Skeleton className="h-8! w-40 max-tablet:hidden" /></div>
      <div className="h-[38px] border-b border-edge bg-panel max-tablet:h-12" />
      <div className="drafting-grid flex-1" />
      <div className="h-7 border-t border-edge bg-panel max-tablet:hidden" />
    </div>
  );
}
