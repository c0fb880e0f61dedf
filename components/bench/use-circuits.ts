'use client';
import { useInfiniteQuery } from '@tanstack/react-query';
import { callApi } from '@/components/query/api';
import { queryKeys } from '@/components/query/keys';
import { circuitSchema } from '@/lib/schemas/circuit';
import { pageOf } from '@/lib/schemas/page';

const pageSchema = pageOf(circuitSchema);

/** Circuits of a bench, last changed first; asked for again when the window gets the focus. */
export function useCircuits(bench: string) {
  return useInfiniteQuery({
    queryKey: queryKeys.circuits(bench),
    queryFn: ({ pageParam, signal }) => callApi(`/api/benches/${bench}/circuits?limit=100${pageParam ? `&cursor=${encodeURIComponent(pageParam)}` : ''}`, { answer: pageSchema, signal }),
    initialPageParam: '',
    getNextPageParam: (page) => page.next,
    select: (data) => data.pages.flatMap((page) => page.items),
    refetchInterval: 30_000,
  });
}
