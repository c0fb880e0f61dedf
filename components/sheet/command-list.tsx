'use client';
import { useEffect, useRef } from 'react';
import { Button } from '@/components/ui/button';
import type { Editor } from '@/lib/editor/editor';
import { commands, type CommandName } from '@/lib/editor/commands/command-list';
import { useEditorValue } from './canvas/canvas-context';

const groups = ['Tools', 'Parts', 'Wires and nets', 'Edit', 'View', 'Plan'] as const;
const names = Object.keys(commands) as CommandName[];
/** Commands that need nothing but a press can be done from the list. */
const withoutArgs: ReadonlySet<CommandName> = new Set([
  'tool-select', 'tool-wire', 'tool-net-name', 'tool-note', 'tool-lift', 'tool-add', 'turn-left', 'turn-right', 'mirror', 'delete', 'cut', 'copy', 'paste',
  'duplicate', 'select-all', 'undo', 'redo', 'zoom-in', 'zoom-out', 'zoom-fit', 'toggle-keys',
]);

const keyWords = (key: string): string => key.replace('Mod', 'Ctrl').replace('Arrow', '').split('+').join(' ').replace(/ $/, ' +');

/** Every command with its key, in one list. The single keys can be switched off here. */
export function CommandList({ editor, onClose }: { readonly editor: Editor; readonly onClose: () => void }) {
  const keysOn = useEditorValue(editor, (state) => state.keysOn);
  const panel = useRef<HTMLDivElement>(null);
  useEffect(() => panel.current?.focus(), []);
  return (
    <div
      ref={panel}
      role="dialog"
      aria-label="Commands and keys"
      data-not-canvas
      tabIndex={-1}
      onKeyDown={(event) => { if (event.key === 'Escape') onClose(); }}
      className="absolute top-3 right-3 left-3 z-[9] mx-auto max-w-[640px] border-[1.5px] border-ink bg-film p-4 text-ink shadow-lift outline-none"
    >
      <div className="mb-2 flex items-center justify-between">
        <h2 className="font-cond text-xl leading-tight font-semibold">Commands and keys</h2>
        <Button onClick={onClose}>Close</Button>
      </div>
      <label className="mb-3 flex min-h-6 items-center gap-2 text-md">
        <input type="checkbox" checked={keysOn} onChange={() => editor.run('toggle-keys')} />
        Single keys (digits, comma, full stop, minus) work while the sheet has the focus
      </label>
      <div className="grid max-h-[60vh] grid-cols-2 gap-x-8 gap-y-4 overflow-y-auto max-tablet:grid-cols-1">
        {groups.map((group) => {
          const listed = names.filter((name) => commands[name].group === group && (commands[name].keys.length > 0 || withoutArgs.has(name)));
          return listed.length === 0 ? null : (
            <section key={group} aria-label={group}>
              <h3 className="silk mb-1 text-silk-2">{group}</h3>
              <ul>
                {listed.map((name) => (
                  <li key={name} className="flex min-h-7 items-center justify-between gap-4 text-md">
                    {withoutArgs.has(name) && editor.can(name)
                      ? <button type="button" className="min-h-6 text-left hover:text-act" onClick={() => { onClose(); editor.run(name as 'undo'); }}>{commands[name].title}</button>
                      : <span>{commands[name].title}</span>}
                    <span className="flex flex-none gap-1">{commands[name].keys.map((key) => <kbd key={key} className="rounded-key border border-edge px-1.5 font-mono text-legend">{keyWords(key)}</kbd>)}</span>
                  </li>
                ))}
              </ul>
            </section>
          );
        })}
      </div>
    </div>
  );
}
