'use client';
import { createContext, useContext, useSyncExternalStore } from 'react';
import type { Editor } from '@/lib/editor/editor';
import type { EditorState } from '@/lib/editor/editor-state';
import type { PlacedLabel } from '@/components/drawing/label-places';

export interface CanvasContextValue {
  readonly editor: Editor;
  /** Words of each part, placed for the sheet as it is written; a part being dragged takes its words along. */
  readonly labels: ReadonlyMap<string, PlacedLabel>;
  readonly zigzag: boolean;
  /** Parts lit from the margin. */
  readonly lit: ReadonlySet<string>;
}

const CanvasContext = createContext<CanvasContextValue | null>(null);
export const CanvasProvider = CanvasContext.Provider;

export function useCanvas(): CanvasContextValue {
  const value = useContext(CanvasContext);
  if (value === null) throw new Error('A part of the canvas stands outside it.');
  return value;
}

/** One thing of the editor's state; the component is drawn anew only when that thing changes. */
export function useEditorValue<T>(editor: Editor, pick: (state: EditorState) => T): T {
  return useSyncExternalStore(editor.subscribe, () => pick(editor.state), () => pick(editor.state));
}
