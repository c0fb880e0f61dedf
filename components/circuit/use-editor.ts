'use client';
import { useEffect, useMemo, useSyncExternalStore } from 'react';
import { Editor } from '@/lib/editor/editor';
import type { EditorState } from '@/lib/editor/editor-state';
import type { SheetSnapshot } from '@/realtime/client/sheet-session';

const never = () => () => undefined;

/** What the page around the canvas draws from; the canvas follows drags, hovering and the cursor by itself. */
const followed = ['sheet', 'selection', 'tool', 'lifted', 'readOnly', 'keysOn', 'canUndo', 'canRedo', 'message'] as const satisfies readonly (keyof EditorState)[];

/** The editor's state, the same object for as long as nothing of it changed that the page shows: a drag draws the canvas, not the page. */
function quietState(editor: Editor): () => EditorState {
  let last = editor.state;
  return () => {
    const now = editor.state;
    const same = followed.every((key) => now[key] === last[key]) && now.gesture.doing === last.gesture.doing && (now.ghost === null) === (last.ghost === null);
    if (!same) last = now;
    return last;
  };
}

/** The editor of the document in hand. Another document, after a refused edit, gets an editor with a history of its own. */
export function useEditor(snapshot: SheetSnapshot | null): { readonly editor: Editor | null; readonly state: EditorState | null } {
  const doc = snapshot?.loaded ? snapshot.doc : null;
  const editable = snapshot?.editable ?? false;
  const editor = useMemo(() => (doc ? new Editor({ doc, readOnly: true }) : null), [doc]);
  useEffect(() => editor?.connect(), [editor]);
  useEffect(() => { editor?.setReadOnly(!editable); }, [editor, editable]);
  const read = useMemo(() => (editor ? quietState(editor) : () => null), [editor]);
  const state = useSyncExternalStore(editor?.subscribe ?? never, read, () => null);
  return { editor, state };
}
