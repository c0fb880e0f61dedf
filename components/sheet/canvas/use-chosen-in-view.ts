'use client';
import { useEffect, type RefObject } from 'react';
import { useReactFlow } from 'reactflow';
import { indexOf } from '@/lib/document/geometry/sheet-index';
import type { Editor } from '@/lib/editor/editor';
import { useEditorValue } from './canvas-context';

/** Brings the one chosen part into view when it is not: chosen in a table or the margin, or nudged over the edge. */
export function useChosenInView(editor: Editor, root: RefObject<HTMLDivElement | null>): void {
  const flow = useReactFlow();
  const part = useEditorValue(editor, ({ sheet, selection }) => {
    const [id, ...more] = selection;
    return id !== undefined && more.length === 0 ? indexOf(sheet).part.get(id) : undefined;
  });
  useEffect(() => {
    const { width = 0, height = 0 } = root.current?.getBoundingClientRect() ?? {};
    if (!part || width === 0) return;
    const { x, y, zoom } = flow.getViewport();
    const [left, top] = [part.x * zoom + x, part.y * zoom + y];
    if (left < 0 || top < 0 || left > width || top > height) void flow.setCenter(part.x, part.y, { zoom });
  }, [flow, part, root]);
}
