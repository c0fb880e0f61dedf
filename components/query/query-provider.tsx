'use client';
import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { useState, type ReactNode } from 'react';
import { ApiProblem } from './api';
import { ToastProvider } from '@/components/ui/toasts';

/** A refusal is an answer and is not asked for again; a lost connection is. */
function retry(count: number, error: Error): boolean {
  const status = error instanceof ApiProblem ? error.body.status : 500;
  return count < 2 && (status === 0 || status >= 500);
}

function makeClient(): QueryClient {
  return new QueryClient({
    defaultOptions: {
      queries: { retry, staleTime: 15_000, networkMode: 'always' },
      mutations: { retry: false, networkMode: 'always' },
    },
  });
}

/** One cache for a page and what is told in passing on it. */
export function QueryProvider({ children }: { readonly children: ReactNode }) {
  const [client] = useState(makeClient);
  return (
    <QueryClientProvider client={client}>
      <ToastProvider>{children}</ToastProvider>
    </QueryClientProvider>
  );
}
