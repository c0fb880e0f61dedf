'use client';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Initials } from '@/components/ui/initials';
import { Moment } from '@/components/ui/moment';
import { PlainText } from '@/components/ui/plain-text';
import type { Objection } from '@/lib/schemas/revision';
import { ReasonDialog } from './reason-dialog';
import type { ReviewActs } from './use-review-acts';

interface ObjectionsPanelProps {
  readonly objections: readonly Objection[];
  readonly personId: string | null;
  readonly mayOverride: boolean;
  readonly acts: ReviewActs;
}

/** 'Ask for changes' in force and those that were lifted or overridden, whose reasons stay. */
export function ObjectionsPanel({ objections, personId, mayOverride, acts }: ObjectionsPanelProps) {
  const [ending, setEnding] = useState<{ readonly objection: Objection; readonly override: boolean } | null>(null);
  if (objections.length === 0) return null;
  return (
    <section aria-labelledby="objections" className="border-[1.5px] border-ink bg-film text-ink max-tablet:border-x-0">
      <h2 id="objections" className="silk flex min-h-9 items-center border-b-[1.5px] border-ink px-3 text-sm">Asked for changes</h2>
      <ul>
        {objections.map((objection) => {
          const own = objection.by.id === personId;
          const force = !objection.liftedAt;
          return (
            <li key={objection.id} className="grid grid-cols-[auto_1fr_auto] items-start gap-2.5 border-b border-rule px-3 py-2.5 text-md last:border-0 max-tablet:grid-cols-[auto_1fr]">
              <Initials name={objection.by.name} />
              <div className="min-w-0">
                <p><span className="text-body font-semibold">{objection.by.name}</span> <span className="text-sm text-ink-2">on {objection.revision.letter}, <Moment at={objection.at} form="medium" /></span></p>
                <p className={force ? '' : 'text-ink-2'}><PlainText>{objection.reason}</PlainText></p>
                {force ? null : (
                  <p className="mt-1 text-sm text-caution-ink">{objection.overrideReason ? <>Overridden by {objection.liftedBy?.name ?? 'a steward'}: <PlainText>{objection.overrideReason}</PlainText></> : <>Lifted{objection.liftedBy ? ` by ${objection.liftedBy.name}` : ''}{objection.liftedAt ? <>, <Moment at={objection.liftedAt} form="medium" /></> : null}</>}</p>
                )}
              </div>
              {force && own ? <Button size="small" onClick={() => setEnding({ objection, override: false })}>Lift it</Button>
                : force && mayOverride ? <Button size="small" tone="warn" onClick={() => setEnding({ objection, override: true })}>Override…</Button> : null}
            </li>
          );
        })}
      </ul>
      {ending ? (
        <ReasonDialog
          title={ending.override ? `Override what ${ending.objection.by.name} asks for?` : 'Lift what you asked for?'}
          label={ending.override ? 'Reason, stays visible' : 'A word about it, if you like'}
          required={ending.override}
          keep="Keep it"
          act={ending.override ? 'Override' : 'Lift it'}
          tone={ending.override ? 'danger' : 'primary'}
          onAct={(reason) => acts.lift(ending.objection.id, reason || undefined)}
          onClose={() => setEnding(null)}
        >
          {ending.override ? 'It stays on the record with your reason, and every revision shows it as overridden. It does not make the drawing better.' : 'The revision goes back to in review when nobody else asks for changes.'}
        </ReasonDialog>
      ) : null}
    </section>
  );
}
