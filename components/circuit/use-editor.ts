'use client';
import { useEffect, useState, useSyncExternalStore } from 'react';
import { Editor } from '@/lib/editor/editor';
import type { EditorState } from '@/lib/editor/editor-state';
import type { SheetSnapshot } from '@/realtime/client/sheet-session';

const never = () => () => undefined;

/** The editor of the document in hand. Another document, after a refused edit, gets an editor with a history of its own. */
export function useEditor(snapshot: SheetSnapshot | null): { readonly editor: Editor | null; readonly state: EditorState | null } {
  const [editor, setEditor] = useState<Editor | null>(null);
  const doc = snapshot?.loaded ? snapshot.doc : null;
  const editable = snapshot?.editable ?? false;
  useEffect(() => {
    if (!doc) return;
    const made = new Editor({ doc, readOnly: true });
    setEditor(made);
    return () => { made.destroy(); setEditor(null); };
  }, [doc]);
  useEffect(() => { editor?.setReadOnly(!editable); }, [editor, editable]);
  const state = useSyncExternalStore(editor?.subscribe ?? never, () => editor?.state ?? null, () => null);
  return { editor, state };
}
