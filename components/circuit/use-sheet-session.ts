'use client';
import { useQueryClient } from '@tanstack/react-query';
import { useEffect, useState, useSyncExternalStore } from 'react';
import { ApiProblem, callApi } from '@/components/query/api';
import { queryKeys } from '@/components/query/keys';
import { ticketSchema } from '@/lib/schemas/ticket';
import { openSheetSession } from '@/realtime/client/open-sheet-session';
import type { SheetSession, SheetSnapshot } from '@/realtime/client/sheet-session';

const refusals = new Set([401, 403, 404]);

async function fetchTicket(circuitId: string) {
  try {
    return await callApi(`/api/circuits/${circuitId}/room-ticket`, { method: 'POST', answer: ticketSchema });
  } catch (error) {
    if (error instanceof ApiProblem && refusals.has(error.body.status)) return { refused: error.message };
    throw error;
  }
}

const never = () => () => undefined;

/** The sheet's room, open for as long as the page is; null until the browser's storage has answered. */
export function useSheetSession(circuitId: string, personId: string | null): { readonly session: SheetSession | null; readonly snapshot: SheetSnapshot | null } {
  const client = useQueryClient();
  const [session, setSession] = useState<SheetSession | null>(null);
  useEffect(() => {
    let over = false;
    let opened: SheetSession | null = null;
    let stop: (() => void) | undefined;
    void openSheetSession({ circuitId, personId, fetchTicket: () => fetchTicket(circuitId) }).then((made) => {
      if (over) { made.close(); return; }
      opened = made;
      stop = made.onEvent(({ topic }) => {
        const key = topic === 'threads' ? queryKeys.threads(circuitId) : topic === 'revisions' ? queryKeys.revisions(circuitId) : queryKeys.circuit(circuitId);
        void client.invalidateQueries({ queryKey: key });
      });
      setSession(made);
    });
    return () => { over = true; stop?.(); opened?.close(); setSession(null); };
  }, [circuitId, personId, client]);
  const snapshot = useSyncExternalStore(session?.subscribe ?? never, () => session?.getSnapshot() ?? null, () => null);
  return { session, snapshot };
}
