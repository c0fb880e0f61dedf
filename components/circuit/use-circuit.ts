'use client';
import { useQuery } from '@tanstack/react-query';
import { z } from 'zod';
import { callApi } from '@/components/query/api';
import { queryKeys } from '@/components/query/keys';
import { findingSchema } from '@/lib/netlist/findings/finding';
import { circuitSchema } from '@/lib/schemas/circuit';
import { memberSchema } from '@/lib/schemas/bench';
import { pageOf } from '@/lib/schemas/page';
import { revisionSchema, type Revision } from '@/lib/schemas/revision';
import { threadSchema } from '@/lib/schemas/thread';

const revisionPage = pageOf(revisionSchema);
const memberPage = pageOf(memberSchema);
const threadList = z.object({ items: z.array(threadSchema) });
const findingList = z.object({ findings: z.array(findingSchema) });

export function useCircuit(id: string) {
  return useQuery({ queryKey: queryKeys.circuit(id), queryFn: ({ signal }) => callApi(`/api/circuits/${id}`, { answer: circuitSchema, signal }) });
}

/** All revisions, newest first. */
export function useRevisions(circuit: string) {
  return useQuery({
    queryKey: queryKeys.revisions(circuit),
    queryFn: async ({ signal }) => {
      const all: Revision[] = [];
      let cursor: string | null = '';
      do {
        const page: z.infer<typeof revisionPage> = await callApi(`/api/circuits/${circuit}/revisions?limit=100${cursor ? `&cursor=${encodeURIComponent(cursor)}` : ''}`, { answer: revisionPage, signal });
        all.push(...page.items);
        cursor = page.next;
      } while (cursor);
      return all;
    },
  });
}

/** Notes of the margin. Guests have none. */
export function useThreads(circuit: string, enabled: boolean) {
  return useQuery({
    queryKey: queryKeys.threads(circuit),
    enabled,
    queryFn: async ({ signal }) => (await callApi(`/api/circuits/${circuit}/threads`, { answer: threadList, signal })).items,
  });
}

/** What fails on the committed sheet, checked by the server: for a page that does not have the sheet open. */
export function useSheetFindings(circuit: string, enabled: boolean) {
  return useQuery({
    queryKey: queryKeys.sheetFindings(circuit),
    enabled,
    queryFn: async ({ signal }) => (await callApi(`/api/circuits/${circuit}/findings`, { answer: findingList, signal })).findings,
  });
}

/** What the checks said at the cut. They never change. */
export function useRevisionFindings(revision: string | undefined) {
  return useQuery({
    queryKey: queryKeys.revisionFindings(revision ?? ''),
    enabled: revision !== undefined,
    staleTime: Infinity,
    queryFn: async ({ signal }) => (await callApi(`/api/revisions/${revision}/findings?outcomes=all`, { answer: findingList, signal })).findings,
  });
}

export function useMembers(bench: string, enabled: boolean) {
  return useQuery({
    queryKey: queryKeys.members(bench),
    enabled,
    queryFn: async ({ signal }) => (await callApi(`/api/benches/${bench}/members?limit=200`, { answer: memberPage, signal })).items,
  });
}
