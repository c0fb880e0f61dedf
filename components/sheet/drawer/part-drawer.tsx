'use client';
import { memo, useEffect, useRef, useState, type KeyboardEvent } from 'react';
import { artOf } from '@/components/drawing/part-view';
import { SymbolView } from '@/components/drawing/symbol-view';
import type { Editor } from '@/lib/editor/editor';
import type { Kind } from '@/lib/netlist/kinds/kind';
import { useEditorValue } from '../canvas/canvas-context';
import { ResistorForm } from './resistor-form';
import { searchKinds } from './search-kinds';

/** Size of a symbol in the drawer, pixels. */
const keyIcon = { width: 56, height: 32 };

function KindKey({ kind, zigzag, onTake, onDragStart }: { readonly kind: Kind; readonly zigzag: boolean; readonly onTake: () => void; readonly onDragStart: () => void }) {
  const art = artOf(kind.id, zigzag);
  const [left, top, right, bottom] = art.box;
  // The whole symbol with room for its strokes; small ones are drawn no larger than the others.
  const width = Math.max(right - left + 6, ((bottom - top + 6) * keyIcon.width) / keyIcon.height, 80);
  const height = (width * keyIcon.height) / keyIcon.width;
  const [x, y] = [(left + right - width) / 2, (top + bottom - height) / 2];
  return (
    <button type="button" data-kind={kind.id} onClick={onTake} onPointerDown={(event) => { if (event.button === 0 && event.pointerType === 'mouse') onDragStart(); }} className="flex min-h-9 w-full items-center gap-2 px-2 text-left text-sm text-silk hover:bg-key-hi focus-visible:outline-2 focus-visible:-outline-offset-2 focus-visible:outline-act">
      <svg width={keyIcon.width} height={keyIcon.height} viewBox={`${x} ${y} ${width} ${height}`} aria-hidden="true" className="flex-none [--film:var(--panel)] [--ink:var(--silk)]"><SymbolView art={art} /></svg>
      <span className="min-w-0 leading-tight">{kind.title}</span>
    </button>
  );
}

interface PartDrawerProps {
  readonly editor: Editor;
  readonly zigzag: boolean;
  readonly onZigzag: (zigzag: boolean) => void;
  /** Gives the focus to the canvas, so that keys move and turn the part in hand. */
  readonly onTaken: () => void;
}

/** Parts by family, in the order of the job. A click or Enter takes one in hand, a drag carries it to its place. */
export const PartDrawer = memo(function PartDrawer({ editor, zigzag, onZigzag, onTaken }: PartDrawerProps) {
  const [typed, setTyped] = useState('');
  const [open, setOpen] = useState<string>('Switch');
  const search = useRef<HTMLInputElement>(null);
  const list = useRef<HTMLDivElement>(null);
  const asked = useEditorValue(editor, (state) => state.tool === 'add' && state.ghost === null);
  useEffect(() => {
    if (!asked) return;
    search.current?.focus();
    search.current?.select();
  }, [asked]);
  const groups = searchKinds(typed);
  const take = (kind: Kind) => {
    editor.run('hold-part', { kind: kind.id });
    setTyped('');
    onTaken();
  };
  const keys = () => [...(list.current?.querySelectorAll<HTMLElement>('button') ?? [])];
  const onKeyDown = (event: KeyboardEvent) => {
    if (event.key === 'Escape') {
      event.preventDefault();
      setTyped('');
      editor.run('tool-select');
      onTaken();
    } else if (event.key === 'ArrowDown' || event.key === 'ArrowUp') {
      event.preventDefault();
      const all = keys();
      const at = all.indexOf(document.activeElement as HTMLElement);
      (event.key === 'ArrowDown' ? all[at + 1] : all[at - 1] ?? search.current)?.focus();
    } else if (event.key === 'Enter' && event.target === search.current) {
      event.preventDefault();
      const first = groups[0]?.kinds[0];
      if (first && typed.trim() !== '') take(first);
    }
  };
  return (
    <aside aria-label="Parts" onKeyDown={onKeyDown} className="groove-r flex w-[196px] flex-none flex-col overflow-y-auto bg-panel max-tablet:hidden print:hidden">
      <h2 className="sr-only">Parts</h2>
      <div className="relative p-2.5">
        <label className="sr-only" htmlFor="drawer-search">Add a part</label>
        <input ref={search} id="drawer-search" type="search" value={typed} placeholder="Add a part" autoComplete="off" onChange={(event) => setTyped(event.target.value)} className="h-[30px] w-full rounded-key border border-edge bg-film pr-9 pl-2.5 text-md text-ink placeholder:text-ink-2" />
        <kbd aria-hidden="true" className="absolute top-[15px] right-4 rounded-key border border-edge px-1.5 font-mono text-legend text-ink-2">0</kbd>
      </div>
      <div ref={list} className="min-h-0 flex-1">
        {groups.length === 0 ? <p className="px-3 py-2 text-sm text-silk-2">No part is called so. Try its use: clamp, drive, contact.</p> : null}
        {groups.map(({ family, kinds }) => {
          const shown = typed.trim() !== '' || open === family;
          return (
            <section key={family} className="groove-b">
              <h3>
                <button type="button" aria-expanded={shown} onClick={() => setOpen(open === family ? '' : family)} className="flex h-7 w-full items-center gap-2 px-2.5 text-left">
                  <span aria-hidden="true" className={shown ? 'rotate-90 text-legend' : 'text-legend'}>▸</span>
                  <span className="silk flex-1 text-silk">{family}</span>
                  <span className="font-mono text-legend text-silk-2">{kinds.length}</span>
                </button>
              </h3>
              {shown ? kinds.map((kind) => <KindKey key={kind.id} kind={kind} zigzag={zigzag} onTake={() => take(kind)} onDragStart={() => editor.run('hold-part', { kind: kind.id })} />) : null}
            </section>
          );
        })}
      </div>
      <ResistorForm zigzag={zigzag} onZigzag={onZigzag} />
    </aside>
  );
});
