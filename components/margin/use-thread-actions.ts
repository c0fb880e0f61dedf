'use client';
import { useQueryClient } from '@tanstack/react-query';
import { callApi } from '@/components/query/api';
import { queryKeys } from '@/components/query/keys';
import type { Finding } from '@/lib/netlist/findings/finding';
import { messageSchema, threadSchema } from '@/lib/schemas/thread';
import type { MarginActions } from './margin-context';

/** The margin's acts on a circuit's notes; the list is asked for again after each. */
export function useThreadActions(circuit: string, take: ((finding: Finding) => void) | null): MarginActions {
  const client = useQueryClient();
  const refreshing = async <T,>(act: Promise<T>): Promise<T> => {
    const done = await act;
    await client.invalidateQueries({ queryKey: queryKeys.threads(circuit) });
    return done;
  };
  return {
    open: (thread) => refreshing(callApi(`/api/circuits/${circuit}/threads`, { method: 'POST', body: thread, answer: threadSchema })),
    reply: (thread, body) => refreshing(callApi(`/api/threads/${thread}/messages`, { method: 'POST', body: { body }, answer: messageSchema })),
    setStatus: (thread, status, body) => refreshing(callApi(`/api/threads/${thread}`, { method: 'PATCH', body: { status, ...(body ? { body } : {}) }, answer: threadSchema })),
    editMessage: (message, body) => refreshing(callApi(`/api/messages/${message}`, { method: 'PATCH', body: { body }, answer: messageSchema })),
    take,
  };
}
