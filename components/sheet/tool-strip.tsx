'use client';
import { classNames } from '@/components/ui/class-names';
import { IconButton } from '@/components/ui/button';
import type { Editor } from '@/lib/editor/editor';
import { commands, type CommandName } from '@/lib/editor/commands/command-list';
import { useEditorValue } from './canvas/canvas-context';

const strip = [
  { name: 'tool-select', tool: 'select', words: 'Select' },
  { name: 'tool-wire', tool: 'wire', words: 'Wire' },
  { name: 'tool-net-name', tool: 'net-name', words: 'Net name' },
  { name: 'tool-note', tool: 'note', words: 'Note' },
  { name: 'tool-lift', tool: 'lift', words: 'Lift lead' },
] as const satisfies readonly { readonly name: CommandName; readonly tool: string; readonly words: string }[];

/** Tools in the order of their digits, then undo and redo. */
export function ToolStrip({ editor, onCommands }: { readonly editor: Editor; readonly onCommands: () => void }) {
  const tool = useEditorValue(editor, (state) => state.tool);
  const readOnly = useEditorValue(editor, (state) => state.readOnly);
  const canUndo = useEditorValue(editor, (state) => state.canUndo && !state.readOnly);
  const canRedo = useEditorValue(editor, (state) => state.canRedo && !state.readOnly);
  const shown = strip.filter((one) => !readOnly || one.tool === 'select' || one.tool === 'lift');
  return (
    <section aria-label="Drawing" className="flex items-center gap-2 max-tablet:hidden">
      <div role="toolbar" aria-label="Tools" className="inline-flex">
        {shown.map((one) => (
          <button
            key={one.name}
            type="button"
            aria-pressed={tool === one.tool}
            aria-keyshortcuts={commands[one.name].keys[0]}
            title={commands[one.name].title}
            onClick={() => editor.run(one.name)}
            className={classNames(
              '-ml-px inline-flex h-[30px] items-center gap-[7px] border border-edge px-[11px] font-cond text-sm leading-none font-semibold tracking-[.05em] uppercase first:ml-0 first:rounded-l-key last:rounded-r-key',
              tool === one.tool ? 'bg-key-hi shadow-[inset_0_-3px_0_var(--act)]' : 'bg-key hover:bg-key-hi',
            )}
          >
            {one.words}
            <span aria-hidden="true" className="font-mono text-legend font-normal text-silk-2">{commands[one.name].keys[0]}</span>
          </button>
        ))}
      </div>
      {readOnly ? null : (
        <>
          <IconButton icon="undo" tone="plain" label="Undo" aria-keyshortcuts="Control+Z" refused={!canUndo} onClick={() => editor.run('undo')} />
          <IconButton icon="redo" tone="plain" label="Redo" aria-keyshortcuts="Control+Shift+Z" refused={!canRedo} onClick={() => editor.run('redo')} />
        </>
      )}
      <IconButton icon="bars" tone="plain" label="All commands and keys" onClick={onCommands} />
    </section>
  );
}
