'use client';
import { useMemo, type ClipboardEvent, type KeyboardEvent } from 'react';
import type { Editor } from '@/lib/editor/editor';
import { parseClip } from '@/lib/editor/edits/clip';

const typing = (target: EventTarget): boolean => target instanceof HTMLElement && target.closest('input, textarea, select, [contenteditable]') !== null;

/** Id of the part or wire that has the focus. */
function focusedItem(target: EventTarget): string | null {
  const item = target instanceof Element ? target.closest('.react-flow__node, .react-flow__edge') : null;
  return item?.getAttribute('data-id') ?? null;
}

/**
 * Keys and the clipboard of the sheet. They are live only while something of the sheet has the focus and nobody types. Copied parts
 * go to the system's clipboard as text, so that they can be pasted on another sheet.
 */
export function useCanvasKeys(editor: Editor) {
  return useMemo(() => ({
    onKeyDown(event: KeyboardEvent) {
      if (typing(event.target) || event.defaultPrevented) return;
      const mod = event.ctrlKey || event.metaKey;
      const item = focusedItem(event.target);
      if (item !== null && !mod && (event.key === ' ' || (event.key === 'Enter' && editor.state.tool === 'select'))) {
        event.preventDefault();
        const { selection } = editor.state;
        editor.run('select-items', { ids: event.shiftKey ? [...selection, item] : [item] });
        return;
      }
      if (event.key === 'Enter' && !mod && editor.state.tool === 'select' && editor.state.selection.size === 1) {
        event.preventDefault();
        document.querySelector<HTMLElement>('[data-form] input, [data-form] select')?.focus();
        return;
      }
      if (mod && ['c', 'x', 'v'].includes(event.key.toLowerCase())) return;
      if (editor.key({ key: event.key, mod, shift: event.shiftKey, alt: event.altKey })) event.preventDefault();
    },
    onCopy(event: ClipboardEvent) {
      if (!typing(event.target) && editor.run('copy') && editor.clipboard) offer(event, editor);
    },
    onCut(event: ClipboardEvent) {
      if (!typing(event.target) && editor.run('cut') && editor.clipboard) offer(event, editor);
    },
    onPaste(event: ClipboardEvent) {
      if (typing(event.target)) return;
      event.preventDefault();
      const text = event.clipboardData.getData('text/plain');
      const clip = parseClip(text);
      if (clip === null && text.trim() !== '') {
        editor.say('What is on the clipboard is no part of a sheet. Copy parts here or on another sheet first.');
        return;
      }
      const same = clip && editor.clipboard && JSON.stringify(clip.parts.map((part) => part.id)) === JSON.stringify(editor.clipboard.parts.map((part) => part.id));
      editor.run('paste', clip && !same ? { clip } : undefined);
    },
  }), [editor]);
}

function offer(event: ClipboardEvent, editor: Editor): void {
  event.preventDefault();
  event.clipboardData.setData('text/plain', JSON.stringify(editor.clipboard));
}
