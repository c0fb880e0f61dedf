'use client';
import { useState } from 'react';
import { wordsOf } from '@/components/query/api';

interface Act {
  readonly busy: boolean;
  readonly error: string | null;
  /** Runs one act; true when it was done. A second call while one runs is dropped. */
  readonly run: (act: () => Promise<unknown>) => Promise<boolean>;
  readonly clear: () => void;
}

/** One act at a time, with what went wrong kept where it happened. */
export function useAct(): Act {
  const [busy, setBusy] = useState(false);
  const [error, setError] = useState<string | null>(null);
  const run = async (act: () => Promise<unknown>) => {
    if (busy) return false;
    setBusy(true);
    setError(null);
    try {
      await act();
      return true;
    } catch (problem) {
      const { title, detail } = wordsOf(problem);
      setError(detail && detail !== title ? `${title} ${detail}` : title);
      return false;
    } finally {
      setBusy(false);
    }
  };
  return { busy, error, run, clear: () => setError(null) };
}
