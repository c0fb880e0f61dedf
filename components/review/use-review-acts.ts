'use client';
import { useQueryClient } from '@tanstack/react-query';
import { callApi } from '@/components/query/api';
import { queryKeys } from '@/components/query/keys';
import { objectionSchema, revisionSchema, signOffSchema, type NewSignOff, type Revision, type SignOff } from '@/lib/schemas/revision';

export interface ReviewActs {
  readonly cut: (note: string, seq: number | undefined) => Promise<Revision>;
  readonly ask: (revision: string, reviewers: readonly string[]) => Promise<Revision>;
  readonly sign: (revision: string, input: NewSignOff) => Promise<SignOff>;
  readonly withdraw: (signOff: string, reason: string | undefined) => Promise<unknown>;
  readonly object: (revision: string, reason: string) => Promise<unknown>;
  readonly lift: (objection: string, reason: string | undefined) => Promise<unknown>;
}

/** The acts of a review. Each resolves when the server has it, and everything that shows the circuit is asked for again. */
export function useReviewActs(circuit: string): ReviewActs {
  const client = useQueryClient();
  const refreshing = async <T,>(act: Promise<T>): Promise<T> => {
    const done = await act;
    await client.invalidateQueries({ queryKey: queryKeys.circuit(circuit) });
    return done;
  };
  const ending = (reason: string | undefined) => (reason === undefined || reason === '' ? {} : { reason });
  return {
    cut: (note, seq) => refreshing(callApi(`/api/circuits/${circuit}/revisions`, { method: 'POST', body: { note, ...(seq === undefined ? {} : { seq }) }, answer: revisionSchema })),
    ask: (revision, reviewers) => refreshing(callApi(`/api/revisions/${revision}/review`, { method: 'POST', body: { reviewers }, answer: revisionSchema })),
    sign: (revision, input) => refreshing(callApi(`/api/revisions/${revision}/sign-offs`, { method: 'POST', body: input, answer: signOffSchema })),
    withdraw: (signOff, reason) => refreshing(callApi(`/api/sign-offs/${signOff}`, { method: 'DELETE', body: ending(reason), answer: signOffSchema })),
    object: (revision, reason) => refreshing(callApi(`/api/revisions/${revision}/objections`, { method: 'POST', body: { reason }, answer: objectionSchema })),
    lift: (objection, reason) => refreshing(callApi(`/api/objections/${objection}`, { method: 'DELETE', body: ending(reason), answer: objectionSchema })),
  };
}
