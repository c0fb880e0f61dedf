'use client';
import { useState, type FormEvent } from 'react';
import { useAct } from '@/components/margin/use-act';
import { pointWords, voltsWords } from '@/components/ladder/plan-words';
import { Button } from '@/components/ui/button';
import { Checkbox } from '@/components/ui/choice';
import { TextArea, TextField } from '@/components/ui/field';
import { Mark } from '@/components/ui/mark';
import { Initials } from '@/components/ui/initials';
import type { Finding } from '@/lib/netlist/findings/finding';
import type { Revision } from '@/lib/schemas/revision';
import { hashWords } from './revision-words';
import type { ReviewActs } from './use-review-acts';

interface SignFormProps {
  readonly revision: Revision;
  readonly holdPoint: string | null;
  /** Why it cannot be signed now. */
  readonly refused: string | null;
  readonly person: { readonly name: string };
  /** Undetermined stop rules at or below the hold point: listed to the signer and kept with the sign-off. */
  readonly undetermined: readonly Finding[];
  readonly acts: ReviewActs;
  readonly onSigned: () => void;
  readonly onAskForChanges: (() => void) | null;
}

const day = 86_400_000;

function dateIn(days: number): string {
  return new Date(Date.now() + days * day).toISOString().slice(0, 10);
}

/** Signing is a step: conditions, until when, which hash, the signer's own word, then the button. */
export function SignForm({ revision, holdPoint, refused, person, undetermined, acts, onSigned, onAskForChanges }: SignFormProps) {
  const [conditions, setConditions] = useState('');
  const [until, setUntil] = useState(() => dateIn(90));
  const [read, setRead] = useState(false);
  const { busy, error, run } = useAct();
  const point = revision.holdPoints.find((one) => one.name === holdPoint);
  const why = refused ?? (point ? null : 'choose a hold point') ?? (read ? null : 'say that you have read it');
  const submit = async (event: FormEvent) => {
    event.preventDefault();
    if (!point || why !== null) return;
    const done = await run(() => acts.sign(revision.id, {
      holdPoint: point.name, contentHash: revision.contentHash, ...(conditions.trim() ? { conditions: conditions.trim() } : {}), ...(until ? { until } : {}),
    }));
    if (done) onSigned();
  };
  return (
    <form onSubmit={(event) => void submit(event)} className="border-[1.5px] border-signed bg-film text-ink max-tablet:border-x-0 max-tablet:border-b-0">
      <div className="flex min-h-9 items-center gap-2 border-b border-signed px-3">
        <h2 className="silk flex-1 text-sm">Sign-off, revision {revision.letter}{point ? `, to ${pointWords(point)}` : ''}</h2>
        <Initials name={person.name} /><span className="text-md max-tablet:hidden">{person.name}, mentor</span>
      </div>
      <div className="grid grid-cols-[1.25fr_1fr] gap-3.5 p-3 max-tablet:grid-cols-1">
        <div className="space-y-2">
          <TextArea label="Conditions, kept with the sign-off" rows={5} value={conditions} maxLength={4_000} onChange={(event) => setConditions(event.target.value)} placeholder="Supply limited before the output goes on; J1 refitted with the drive off." />
          {undetermined.length === 0 ? (
            <p className="flex items-center gap-2 text-sm text-ink-2"><Mark kind="undetermined" size={16} silent />Undetermined at or below{point ? ` ${voltsWords(point.volts)}` : ''}: none of a stop rule</p>
          ) : (
            <div className="text-sm text-ink-2">
              <p className="flex items-center gap-2"><Mark kind="undetermined" size={16} silent />{undetermined.length} undetermined of a stop rule, kept with the sign-off:</p>
              <ul className="mt-1 max-h-24 list-disc overflow-y-auto pl-7">{undetermined.map((finding) => <li key={finding.id}>{finding.message}</li>)}</ul>
            </div>
          )}
          <p className="text-sm text-ink-2">Covers only {revision.letter}, hash <span className="figure text-ink">{hashWords(revision.contentHash)}</span></p>
        </div>
        <div className="flex flex-col gap-3">
          <TextField label="Until" type="date" value={until} min={dateIn(0)} onChange={(event) => setUntil(event.target.value)} />
          <Checkbox checked={read} onChange={(event) => setRead(event.target.checked)}>I have read the sheet, its findings and the lifted leads of {revision.letter}.</Checkbox>
          {error ? <p role="alert" className="flex gap-1.5 text-sm text-stop-ink"><Mark kind="stop" size={16} silent />{error} Nothing was changed.</p> : null}
          <div className="mt-auto flex flex-col gap-2 max-tablet:sticky max-tablet:bottom-0 max-tablet:-mx-3 max-tablet:-mb-3 max-tablet:border-t max-tablet:border-ink max-tablet:bg-panel max-tablet:p-3">
            <Button type="submit" tone="sign" size="large" icon="check" busy={busy} refused={why}>Sign off {revision.letter}{point ? ` to ${voltsWords(point.volts)}` : ''}</Button>
            {why ? <p className="text-center text-xs text-ink-2">Not yet: {why}</p> : null}
            {onAskForChanges ? <Button tone="warn" size="large" onClick={onAskForChanges}>Ask for changes…</Button> : null}
          </div>
        </div>
      </div>
    </form>
  );
}
