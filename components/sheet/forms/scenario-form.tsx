'use client';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import type { ScenarioRecord, Sheet } from '@/lib/document/records';
import type { Editor } from '@/lib/editor/editor';
import { editableQuantity } from '@/lib/netlist/quantity/format-quantity';
import { parseQuantity } from '@/lib/netlist/quantity/parse-quantity';
import { sourcesOf } from './sheet-sources';

type Values = ScenarioRecord['values'];
type Drafts = Readonly<Record<string, string>>;

function draftsOf(values: Values): Drafts {
  return Object.fromEntries(Object.entries(values).flatMap(([id, value]) => [
    ...(value.volts === undefined ? [] : [[`${id} volts`, editableQuantity(value.volts, 'V')]]),
    ...(value.amps === undefined ? [] : [[`${id} amps`, editableQuantity(value.amps, 'A')]]),
  ]));
}

/** Reads every field that is filled; the first that cannot be read is answered with its reason. */
function readValues(drafts: Drafts): { readonly values: Values } | { readonly reason: string } {
  const values: Record<string, { volts?: number; amps?: number }> = {};
  for (const [key, typed] of Object.entries(drafts)) {
    if (typed.trim() === '') continue;
    const [id = '', quantity] = key.split(' ');
    const reading = parseQuantity(typed, { unit: quantity === 'amps' ? 'A' : 'V', subject: quantity === 'amps' ? 'a current limit' : 'a source' });
    if (!reading.ok) return { reason: reading.reason };
    values[id] = { ...values[id], [quantity === 'amps' ? 'amps' : 'volts']: reading.value };
  }
  return { values };
}

/** One scenario: a name, the ambient temperature, and what each source is set to. */
function OneScenario({ editor, sheet, scenario, onDone }: { readonly editor: Editor; readonly sheet: Sheet; readonly scenario: ScenarioRecord | null; readonly onDone: () => void }) {
  const [name, setName] = useState(scenario?.name ?? '');
  const [ambient, setAmbient] = useState(String(scenario?.ambient ?? 25));
  const [drafts, setDrafts] = useState<Drafts>(() => draftsOf(scenario?.values ?? {}));
  const [refused, setRefused] = useState<string | null>(null);
  const keep = () => {
    const degrees = parseQuantity(ambient, { unit: '°C', subject: 'the ambient' });
    if (!degrees.ok) return setRefused(degrees.reason);
    const reading = readValues(drafts);
    if ('reason' in reading) return setRefused(reading.reason);
    const done = editor.run('put-scenario', { ...(scenario ? { id: scenario.id } : {}), name, ambient: degrees.value, values: reading.values });
    if (done) onDone();
    else setRefused(editor.state.message);
  };
  const field = 'h-8 min-w-0 rounded-key border border-edge bg-film px-2 text-sm text-ink';
  return (
    <form aria-label={scenario ? `Scenario ${scenario.name}` : 'New scenario'} className="grid grid-cols-2 gap-1.5 border-t border-rule pt-2" onSubmit={(event) => { event.preventDefault(); keep(); }}>
      <input aria-label="Name" placeholder="Name" maxLength={120} value={name} onChange={(event) => setName(event.target.value)} className={field} />
      <input aria-label="Ambient, °C" placeholder="25 °C" value={ambient} onChange={(event) => setAmbient(event.target.value)} className={`${field} font-mono`} />
      {sourcesOf(sheet).map((part) => (
        <div key={part.id} className="contents">
          <input aria-label={`${part.ref}, volts`} placeholder={`${part.ref}: V`} value={drafts[`${part.id} volts`] ?? ''} onChange={(event) => setDrafts({ ...drafts, [`${part.id} volts`]: event.target.value })} className={`${field} font-mono`} />
          <input aria-label={`${part.ref}, current limit`} placeholder={`${part.ref}: A`} value={drafts[`${part.id} amps`] ?? ''} onChange={(event) => setDrafts({ ...drafts, [`${part.id} amps`]: event.target.value })} className={`${field} font-mono`} />
        </div>
      ))}
      {refused ? <p role="alert" className="col-span-2 text-sm text-stop-ink">{refused}</p> : null}
      <div className="col-span-2 flex gap-2">
        {scenario ? <Button onClick={() => editor.run('drop-scenario', { id: scenario.id })}>Remove</Button> : null}
        <span className="flex-1" />
        <Button type="submit">Keep</Button>
      </div>
    </form>
  );
}

/** Scenarios of the sheet: named sets of source values. Each is kept by itself, as an edit that can be undone. */
export function ScenarioForm({ editor, sheet }: { readonly editor: Editor; readonly sheet: Sheet }) {
  const [adding, setAdding] = useState(false);
  return (
    <section aria-label="Scenarios" className="flex flex-col gap-3 bg-film-2 p-3">
      <h3 className="font-cond text-lg font-semibold text-ink">Scenarios</h3>
      <p className="text-sm text-ink-2">What the sources are set to before a hold point raises its own. An empty field keeps what is drawn.</p>
      {sheet.scenarios.map((scenario) => <OneScenario key={`${scenario.id} ${JSON.stringify(scenario)}`} editor={editor} sheet={sheet} scenario={scenario} onDone={() => undefined} />)}
      {adding ? <OneScenario editor={editor} sheet={sheet} scenario={null} onDone={() => setAdding(false)} /> : <Button onClick={() => setAdding(true)}>Add a scenario</Button>}
    </section>
  );
}
