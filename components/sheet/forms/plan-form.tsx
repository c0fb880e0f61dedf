'use client';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import type { Sheet } from '@/lib/document/records';
import type { PlannedPoint } from '@/lib/document/plan/set-plan';
import type { Editor } from '@/lib/editor/editor';
import { editableQuantity, formatQuantity, thinSpace } from '@/lib/netlist/quantity/format-quantity';
import { parseQuantity } from '@/lib/netlist/quantity/parse-quantity';
import { sourcesOf } from './sheet-sources';

interface Row {
  readonly key: string;
  readonly name: string;
  readonly volts: string;
  readonly amps: string;
  readonly source: string;
  readonly scenario: string;
}

function rowsOf(sheet: Sheet): readonly Row[] {
  const refs = new Map(sheet.parts.map((part) => [part.id, part.ref]));
  const names = new Map(sheet.scenarios.map((scenario) => [scenario.id, scenario.name]));
  return sheet.holdPoints.map((point) => ({
    key: point.id, name: point.name, volts: editableQuantity(point.volts, 'V'), amps: editableQuantity(point.amps, 'A'),
    source: refs.get(point.source ?? '') ?? '', scenario: names.get(point.scenario ?? '') ?? '',
  }));
}

type Read = { readonly points: readonly PlannedPoint[] } | { readonly row: string; readonly reason: string };

function read(rows: readonly Row[]): Read {
  const points: PlannedPoint[] = [];
  for (const row of rows) {
    const volts = parseQuantity(row.volts, { unit: 'V', subject: 'a hold point' });
    if (!volts.ok) return { row: row.key, reason: volts.reason };
    const amps = parseQuantity(row.amps, { unit: 'A', subject: 'a current limit' });
    if (!amps.ok) return { row: row.key, reason: amps.reason };
    points.push({ name: row.name.trim() || formatQuantity(volts.value, 'V').replace(thinSpace, ' '), volts: volts.value, amps: amps.value, source: row.source || undefined, scenario: row.scenario || undefined });
  }
  return { points: points.sort((a, b) => a.volts - b.volts) };
}

/** The power-up plan: hold points with volts, current limit, source and scenario. Kept whole, as one edit that can be undone. */
export function PlanForm({ editor, sheet, onDone }: { readonly editor: Editor; readonly sheet: Sheet; readonly onDone: () => void }) {
  const [rows, setRows] = useState<readonly Row[]>(() => rowsOf(sheet));
  const [refused, setRefused] = useState<{ readonly row: string | null; readonly reason: string } | null>(null);
  const [count, setCount] = useState(1);
  const set = (key: string, change: Partial<Row>) => {
    setRefused(null);
    setRows(rows.map((row) => (row.key === key ? { ...row, ...change } : row)));
  };
  const keep = () => {
    const reading = read(rows);
    if ('reason' in reading) return setRefused(reading);
    if (editor.run('set-plan', { points: reading.points })) onDone();
    else setRefused({ row: null, reason: editor.state.message ?? 'The plan cannot be kept so.' });
  };
  const add = () => {
    setRows([...rows, { key: `new ${count}`, name: '', volts: '', amps: '', source: rows.at(-1)?.source ?? '', scenario: '' }]);
    setCount(count + 1);
  };
  const field = 'h-8 min-w-0 rounded-key border border-edge bg-film px-2 text-sm text-ink';
  return (
    <form aria-label="Power-up plan" className="flex flex-col gap-3 bg-film-2 p-3 outline-2 -outline-offset-1 outline-act" onSubmit={(event) => { event.preventDefault(); keep(); }} onKeyDown={(event) => { if (event.key === 'Escape') onDone(); }}>
      <h3 className="font-cond text-lg font-semibold text-act">Power-up plan</h3>
      <p className="text-sm text-ink-2">Each hold point is a step beyond which nothing happens without sign-off. Volts are DC for a DC source, V rms for an AC one.</p>
      {rows.map((row, index) => (
        <fieldset key={row.key} className="grid grid-cols-2 gap-1.5 border-t border-rule pt-2">
          <legend className="sr-only">Hold point {index + 1}</legend>
          <input aria-label="Volts" placeholder="36 V" value={row.volts} onChange={(event) => set(row.key, { volts: event.target.value })} className={`${field} font-mono`} />
          <input aria-label="Current limit" placeholder="0.5 A" value={row.amps} onChange={(event) => set(row.key, { amps: event.target.value })} className={`${field} font-mono`} />
          <input aria-label="Name" placeholder={row.volts || 'Name'} maxLength={120} value={row.name} onChange={(event) => set(row.key, { name: event.target.value })} className={field} />
          <select aria-label="Source" value={row.source} onChange={(event) => set(row.key, { source: event.target.value })} className={field}>
            <option value="">the only supply</option>
            {sourcesOf(sheet).map((part) => <option key={part.id} value={part.ref}>{part.ref}</option>)}
          </select>
          <select aria-label="Scenario" value={row.scenario} onChange={(event) => set(row.key, { scenario: event.target.value })} className={field}>
            <option value="">as drawn</option>
            {sheet.scenarios.map((scenario) => <option key={scenario.id} value={scenario.name}>{scenario.name}</option>)}
          </select>
          <button type="button" onClick={() => setRows(rows.filter((other) => other.key !== row.key))} className="min-h-6 justify-self-end text-sm text-ink-2 underline underline-offset-[3px] hover:text-act">Remove</button>
          {refused?.row === row.key ? <p role="alert" className="col-span-2 text-sm text-stop-ink">{refused.reason}</p> : null}
        </fieldset>
      ))}
      {refused && refused.row === null ? <p role="alert" className="text-sm text-stop-ink">{refused.reason}</p> : null}
      <div className="flex flex-wrap gap-2">
        <Button onClick={add}>Add a hold point</Button>
        <span className="flex-1" />
        <Button onClick={onDone}>Back</Button>
        <Button tone="primary" type="submit">Keep the plan</Button>
      </div>
    </form>
  );
}
