'use client';
import { useState } from 'react';
import { EdgeLabelRenderer } from 'reactflow';
import type { Editor } from '@/lib/editor/editor';
import { useEditorValue } from './canvas-context';

/** A field where a net name or a note was asked for. Enter keeps, Escape goes back; what is refused stays to be mended. */
export function AskingBox({ editor, onDone }: { readonly editor: Editor; readonly onDone: () => void }) {
  const gesture = useEditorValue(editor, (state) => state.gesture);
  if (gesture.doing !== 'asking') return null;
  return (
    <EdgeLabelRenderer>
      <Asked key={`${gesture.what} ${gesture.at.x} ${gesture.at.y}`} editor={editor} what={gesture.what} at={gesture.at} onDone={onDone} />
    </EdgeLabelRenderer>
  );
}

function Asked({ editor, what, at, onDone }: { readonly editor: Editor; readonly what: 'net-name' | 'note'; readonly at: { readonly x: number; readonly y: number }; readonly onDone: () => void }) {
  const [words, setWords] = useState('');
  const [refused, setRefused] = useState<string | null>(null);
  const keep = () => {
    const done = what === 'net-name' ? editor.run('name-net', { at, name: words }) : editor.run('place-note', { at, text: words });
    if (done) onDone();
    else setRefused(editor.state.message);
  };
  const label = what === 'net-name' ? 'Net name' : 'Note';
  return (
    <form
      data-not-canvas
      className="nopan nodrag pointer-events-auto absolute z-[8] flex flex-col gap-1 rounded-box border border-edge bg-panel p-2 shadow-lift"
      style={{ transform: `translate(${at.x + 8}px, ${at.y + 8}px)` }}
      onSubmit={(event) => { event.preventDefault(); keep(); }}
      onKeyDown={(event) => {
        if (event.key !== 'Escape') return;
        event.preventDefault();
        editor.run('cancel');
        onDone();
      }}
    >
      <label className="silk text-silk-2" htmlFor="asked-words">{label}</label>
      {what === 'net-name'
        ? <input id="asked-words" autoFocus value={words} maxLength={60} onChange={(event) => setWords(event.target.value)} aria-invalid={refused !== null} className="h-8 w-44 rounded-key border border-edge bg-film px-2 font-mono text-sm text-ink" />
        : <textarea id="asked-words" autoFocus rows={3} value={words} maxLength={600} onChange={(event) => setWords(event.target.value)} className="w-60 rounded-key border border-edge bg-film px-2 py-1 text-sm text-ink" />}
      {refused === null ? null : <p role="alert" className="max-w-60 text-sm text-stop-ink">{refused}</p>}
      <button type="submit" className="h-7 self-end rounded-key border border-edge bg-key px-2.5 font-cond text-sm font-semibold tracking-[.05em] text-silk uppercase hover:bg-key-hi">Keep</button>
    </form>
  );
}
