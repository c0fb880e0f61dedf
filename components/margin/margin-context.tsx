'use client';
import { createContext, useContext } from 'react';
import type { Finding } from '@/lib/netlist/findings/finding';
import type { NewThread, Thread, ThreadState } from '@/lib/schemas/thread';

/** What a reader of the margin may do. Hints only: every call decides anew. */
export interface MarginRights {
  readonly write: boolean;
  /** Takes proposed changes: makers. */
  readonly edit: boolean;
  /** Resolves notes of others, and those that must be answered. */
  readonly mentor: boolean;
  readonly personId: string | null;
}

export interface MarginActions {
  /** Each resolves when the server has it and throws ApiProblem when refused. */
  readonly open: (thread: NewThread) => Promise<Thread>;
  readonly reply: (thread: string, body: string) => Promise<unknown>;
  readonly setStatus: (thread: string, status: ThreadState, body?: string) => Promise<unknown>;
  readonly editMessage: ((message: string, body: string) => Promise<unknown>) | null;
  /** Applies a finding's proposed change to the sheet as one edit. */
  readonly take: ((finding: Finding) => void) | null;
}

interface MarginContextValue {
  readonly rights: MarginRights;
  readonly actions: MarginActions;
}

const MarginContext = createContext<MarginContextValue | null>(null);
export const MarginProvider = MarginContext.Provider;

export function useMargin(): MarginContextValue {
  const value = useContext(MarginContext);
  if (value === null) throw new Error('The margin stands outside its provider.');
  return value;
}
