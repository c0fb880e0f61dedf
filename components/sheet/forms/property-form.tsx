'use client';
import { useState } from 'react';
import { TextField } from '@/components/ui/field';
import type { PartRecord, Sheet } from '@/lib/document/records';
import type { Editor } from '@/lib/editor/editor';
import { pinDefinitionsOf } from '@/lib/document/geometry/kind-shape';
import { joinedWords } from '@/lib/editor/spoken/part-spoken';
import { kindOf } from '@/lib/netlist/kinds/kind-registry';
import { pinStates } from '../canvas/pin-states';
import { FactField } from './fact-field';

/** Form of one part: a margin entry tied to it. */
export function PropertyForm({ editor, sheet, part, onClose }: { readonly editor: Editor; readonly sheet: Sheet; readonly part: PartRecord; readonly onClose: () => void }) {
  const kind = kindOf(part.kind);
  const [main, ...rest] = kind.fields;
  const joined = part.kind === 'note' || part.kind === 'net-name' ? '' : joinedWords(sheet, part);
  return (
    <section aria-label={`${part.ref || kind.title}, ${kind.title}`} data-form={part.ref || part.id} className="bg-film-2 outline-2 -outline-offset-1 outline-act">
      <header className="flex h-9 items-center gap-2 border-b border-act px-3">
        <h3 className="max-w-[60%] flex-none truncate font-cond text-lg font-semibold text-act">{[part.ref, kind.title.toLowerCase()].filter(Boolean).join(', ')}</h3>
        <span title={joined} className="ml-auto min-w-0 truncate text-sm text-ink-2">{joined}</span>
        <button type="button" aria-label="Close the form" onClick={onClose} className="-mr-1 size-6 flex-none text-lg leading-none text-ink-2 hover:text-act">×</button>
      </header>
      <div className="flex flex-col gap-3 px-3 pt-2.5 pb-3">
        {main ? <FactField key={`${part.id} ${main.fact}`} editor={editor} part={part} kind={kind} field={main} /> : null}
        <div className="grid grid-cols-2 gap-x-2.5 gap-y-3">
          {kind.letter === null ? null : <RefField key={part.id} editor={editor} part={part} />}
          {rest.map((field) => <FactField key={`${part.id} ${field.fact}`} editor={editor} part={part} kind={kind} field={field} />)}
        </div>
        <LeftOpen editor={editor} sheet={sheet} part={part} />
        <p aria-hidden="true" className="flex flex-wrap gap-x-2 text-xs text-ink-2"><kbd className="font-mono">Enter</kbd> keeps <kbd className="font-mono">Esc</kbd> reverts <kbd className="font-mono">Tab</kbd> next</p>
      </div>
    </section>
  );
}

/** The designator; refused when it is taken, with the next free one. */
function RefField({ editor, part }: { readonly editor: Editor; readonly part: PartRecord }) {
  const [draft, setDraft] = useState<string | null>(null);
  const [refused, setRefused] = useState<string | null>(null);
  const keep = () => {
    if (draft === null || draft === part.ref || editor.run('rename-part', { part: part.id, ref: draft })) {
      setDraft(null);
      setRefused(null);
    } else setRefused(editor.state.message);
  };
  return (
    <TextField
      label="Designator"
      value={draft ?? part.ref}
      error={refused}
      readOnly={editor.state.readOnly}
      autoComplete="off"
      className="font-mono"
      onChange={(event) => { setDraft(event.target.value); setRefused(null); }}
      onBlur={() => { if (refused === null) keep(); }}
      onKeyDown={(event) => {
        if (event.key === 'Enter') { event.preventDefault(); keep(); }
        if (event.key === 'Escape' && draft !== null) { event.preventDefault(); event.stopPropagation(); setDraft(null); setRefused(null); }
      }}
    />
  );
}

/** Pins that are joined to nothing, with the mark that says so on purpose. */
function LeftOpen({ editor, sheet, part }: { readonly editor: Editor; readonly sheet: Sheet; readonly part: PartRecord }) {
  const states = (pinStates(sheet).get(part.id) ?? '').split(' ');
  const free = pinDefinitionsOf(part).filter((_, index) => states[index] === 'lone' || states[index] === 'open');
  if (free.length === 0 || kindOf(part.kind).letter === null) return null;
  return (
    <fieldset className="flex flex-wrap items-center gap-x-4 gap-y-1">
      <legend className="silk float-left mr-1 text-ink-2">Left open on purpose</legend>
      {free.map(({ name }) => (
        <label key={name} className="inline-flex min-h-6 items-center gap-1.5 text-sm">
          <input type="checkbox" disabled={editor.state.readOnly} checked={part.leftOpen.includes(name)} onChange={(event) => editor.run('mark-open', { part: part.id, pin: name, open: event.target.checked })} />
          <span className="font-mono">{part.ref}:{name}</span>
        </label>
      ))}
    </fieldset>
  );
}
