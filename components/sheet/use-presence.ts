'use client';
import { useCallback, useEffect, useRef } from 'react';
import type { EditorState } from '@/lib/editor/editor-state';
import type { SheetSession } from '@/realtime/client/sheet-session';

/** Most ids of a selection that are shown to others. */
const shownSelection = 24;

/** Tells the others where this person points and what they have chosen. Answers what the canvas calls as the pointer moves. */
export function usePresence(session: SheetSession | null, state: EditorState | null): (at: { readonly x: number; readonly y: number } | null) => void {
  const cursor = useRef<{ readonly x: number; readonly y: number } | null>(null);
  const chosen = useRef<{ readonly selection: string[]; readonly tool: string }>({ selection: [], tool: 'select' });
  const tell = useCallback(() => session?.setPresence({ cursor: cursor.current, ...chosen.current }), [session]);
  const selection = state?.selection;
  const tool = state?.tool ?? 'select';
  useEffect(() => {
    chosen.current = { selection: [...(selection ?? [])].slice(0, shownSelection), tool };
    tell();
  }, [selection, tool, tell]);
  return useCallback((at) => {
    cursor.current = at;
    tell();
  }, [tell]);
}
