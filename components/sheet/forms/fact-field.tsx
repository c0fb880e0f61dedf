'use client';
import { useId, useState, type KeyboardEvent } from 'react';
import { classNames } from '@/components/ui/class-names';
import { Mark } from '@/components/ui/mark';
import type { PartRecord } from '@/lib/document/records';
import type { Editor } from '@/lib/editor/editor';
import { editableFact, factOfKind, formatFact, readFact } from '@/lib/netlist/facts/read-fact';
import type { FieldDefinition, Kind } from '@/lib/netlist/kinds/kind';
import { offeredValues } from './offered-values';

interface FactFieldProps {
  readonly editor: Editor;
  readonly part: PartRecord;
  readonly kind: Kind;
  readonly field: FieldDefinition;
  readonly autoFocus?: boolean;
}

/** Where a value comes from, in words; assumed ones stand in caution ink. */
function originWords(part: PartRecord, fact: string): string {
  if (part.facts[fact] === undefined) return 'not given';
  return part.origins[fact] ?? 'typed';
}

/**
 * One value of a part, typed as people write it. Enter or leaving the field keeps it, Escape puts the old one back. What is
 * refused stays in the field with the reason, and the part keeps its old value.
 */
export function FactField({ editor, part, kind, field, autoFocus = false }: FactFieldProps) {
  const id = useId();
  const fact = factOfKind(kind, field.fact);
  const stored = part.facts[field.fact];
  const kept = stored === undefined ? '' : editableFact(kind, field.fact, stored as Parameters<typeof editableFact>[2]);
  const [draft, setDraft] = useState<string | null>(null);
  const [refused, setRefused] = useState<string | null>(null);
  const typed = draft ?? kept;

  const keep = (text: string): void => {
    if (text === kept) return back();
    const reading = text.trim() === '' ? { ok: true as const, value: null } : readFact(kind, field.fact, text);
    const stays = stored === undefined ? `${part.ref} stays without it.` : `${part.ref} stays at ${formatFact(kind, field.fact, stored as Parameters<typeof formatFact>[2])}.`;
    if (!reading.ok) return setRefused(`${reading.reason} ${stays}`);
    if (editor.run('set-facts', { part: part.id, facts: { [field.fact]: reading.value } })) back();
    else setRefused(`${editor.state.message ?? 'That cannot be set.'} ${stays}`);
  };
  const back = (): void => {
    setDraft(null);
    setRefused(null);
  };
  const onKeyDown = (event: KeyboardEvent) => {
    if (event.key === 'Enter') {
      event.preventDefault();
      keep(typed);
    } else if (event.key === 'Escape' && draft !== null) {
      event.preventDefault();
      event.stopPropagation();
      back();
    }
  };
  const offered = field.series && draft !== null ? offeredValues(typed, stored, field.series) : [];
  const origin = originWords(part, field.fact);
  const { readOnly } = editor.state;
  const box = 'h-9 w-full rounded-key border bg-film px-2.5 text-md text-ink';
  const choices = field.choices ?? fact.choices;
  return (
    <div className="min-w-0">
      <div className="mb-1 flex items-baseline justify-between gap-2">
        <label htmlFor={id} className="silk text-ink-2">{fact.label}</label>
        <span className={classNames('text-xs', origin === 'assumed' ? 'text-caution-ink' : 'text-ink-2')}>{origin}</span>
      </div>
      {fact.type === 'flag' && fact.unit === '' ? (
        <select id={id} disabled={readOnly} value={kept} onChange={(event) => keep(event.target.value)} className={classNames(box, 'border-edge')}>
          <option value="">not given</option><option value="yes">yes</option><option value="no">no</option>
        </select>
      ) : (
        <span className="relative block">
          <input
            id={id}
            value={typed}
            readOnly={readOnly}
            autoFocus={autoFocus}
            autoComplete="off"
            spellCheck={false}
            list={choices ? `${id}-choices` : undefined}
            aria-invalid={refused !== null}
            aria-describedby={refused === null ? undefined : `${id}-why`}
            onChange={(event) => { setDraft(event.target.value); setRefused(null); }}
            onKeyDown={onKeyDown}
            onBlur={() => { if (draft !== null && refused === null) keep(draft); }}
            className={classNames(box, fact.type === 'label' ? '' : 'font-mono tracking-[-.03em]', refused === null ? 'border-edge' : 'border-stop bg-stop-wash pr-20 shadow-[inset_4px_0_0_var(--stop)]')}
          />
          {refused === null ? null : <span aria-hidden="true" className="absolute top-2 right-2.5 text-sm text-stop-ink">not kept</span>}
          {choices ? <datalist id={`${id}-choices`}>{choices.map((choice) => <option key={choice} value={choice} />)}</datalist> : null}
        </span>
      )}
      {refused === null ? null : <p id={`${id}-why`} role="alert" className="mt-1 flex gap-1.5 text-sm leading-[1.32] text-stop-ink"><Mark kind="stop" size={16} silent /><span>{refused}</span></p>}
      {offered.length === 0 ? null : (
        <div className="mt-1.5 flex flex-wrap items-center gap-1.5" role="group" aria-label={`${field.series} values near`}>
          <span className="silk text-ink-2">{field.series} near</span>
          {offered.map((value) => <button key={value} type="button" onMouseDown={(event) => event.preventDefault()} onClick={() => keep(formatFact(kind, field.fact, value))} className="h-7 rounded-key border border-edge bg-film px-2 font-mono text-xs text-ink hover:border-act hover:text-act">{formatFact(kind, field.fact, value)}</button>)}
        </div>
      )}
    </div>
  );
}
