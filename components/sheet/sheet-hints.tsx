'use client';
import type { Editor } from '@/lib/editor/editor';
import { hoverWords, toolHint } from '@/lib/editor/spoken/hint';
import { useEditorValue } from './canvas/canvas-context';

/** What the pointer is over, for the status strip. */
export function HoverHint({ editor }: { readonly editor: Editor }) {
  return <>{useEditorValue(editor, hoverWords)}</>;
}

/** What the tool in hand waits for, for the status strip. */
export function ToolHint({ editor }: { readonly editor: Editor }) {
  return <>{useEditorValue(editor, toolHint)}</>;
}
