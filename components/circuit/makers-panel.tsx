'use client';
import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { useAct } from '@/components/margin/use-act';
import { callApi } from '@/components/query/api';
import { queryKeys } from '@/components/query/keys';
import { Button } from '@/components/ui/button';
import { Checkbox } from '@/components/ui/choice';
import { Initials } from '@/components/ui/initials';
import { useToast } from '@/components/ui/toasts';
import { circuitSchema, type Circuit } from '@/lib/schemas/circuit';
import { useCircuitPlace, useMay } from './circuit-context';
import { useMembers } from './use-circuit';

/** Who makes the circuit: they edit its sheet and cut it, and none of them signs it, then or later. */
export function MakersPanel({ circuit }: { readonly circuit: Circuit }) {
  const { bench } = useCircuitPlace();
  const may = useMay();
  const client = useQueryClient();
  const toast = useToast();
  const [chosen, setChosen] = useState<readonly string[] | null>(null);
  const members = useMembers(bench.slug, chosen !== null);
  const { busy, error, run } = useAct();
  const current = circuit.makers.map((maker) => maker.id);
  const toggle = (id: string, on: boolean) => setChosen((before) => (on ? [...(before ?? []), id] : (before ?? []).filter((one) => one !== id)));
  const save = async () => {
    const done = await run(async () => {
      await callApi(`/api/circuits/${circuit.id}/makers`, { method: 'PUT', body: { makers: chosen }, answer: circuitSchema });
      await client.invalidateQueries({ queryKey: queryKeys.circuit(circuit.id) });
    });
    if (!done) return;
    setChosen(null);
    toast('The makers are as you named them');
  };
  return (
    <section aria-labelledby="makers" className="border-[1.5px] border-ink bg-film text-ink max-tablet:border-x-0">
      <div className="flex min-h-9 flex-wrap items-center gap-2 border-b-[1.5px] border-ink px-3 py-1">
        <h2 id="makers" className="silk flex-1 text-sm">Makers</h2>
        {may('name makers') && chosen === null ? <Button size="small" icon="person" onClick={() => setChosen(current)}>Name co-makers</Button> : null}
      </div>
      {chosen === null ? (
        <ul className="flex flex-wrap gap-x-6 gap-y-2 px-3 py-2.5">{circuit.makers.map((maker) => <li key={maker.id} className="flex items-center gap-2 text-body"><Initials name={maker.name} />{maker.name}</li>)}</ul>
      ) : (
        <>
          <ul className="max-h-[320px] overflow-y-auto">
            {(members.data ?? []).map((member) => (
              <li key={member.id} className="border-b border-rule last:border-0">
                <Checkbox className="items-center! px-3 py-1.5" checked={chosen.includes(member.id)} onChange={(event) => toggle(member.id, event.target.checked)}>
                  <span className="flex items-center gap-2.5"><Initials name={member.name} /><span className="text-body">{member.name}</span><span className="text-sm text-ink-2">{member.role}</span></span>
                </Checkbox>
              </li>
            ))}
          </ul>
          <div className="flex flex-wrap items-center gap-2 border-t border-ink px-3 py-2.5">
            <Button tone="primary" busy={busy} refused={chosen.length === 0 ? 'a circuit has at least one maker' : null} onClick={() => void save()}>Keep</Button>
            <Button onClick={() => setChosen(null)}>Leave it</Button>
            {error ? <p role="alert" className="text-sm text-stop-ink">{error}</p> : <p className="text-sm text-ink-2">Whoever makes part of a circuit cannot sign it off, also later.</p>}
          </div>
        </>
      )}
    </section>
  );
}
