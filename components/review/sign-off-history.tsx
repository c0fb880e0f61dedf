'use client';
import { useState } from 'react';
import { voltsWords } from '@/components/ladder/plan-words';
import { Button } from '@/components/ui/button';
import { Initials } from '@/components/ui/initials';
import { Moment } from '@/components/ui/moment';
import { PlainText } from '@/components/ui/plain-text';
import type { Revision, SignOff } from '@/lib/schemas/revision';
import { ReasonDialog } from './reason-dialog';
import { voidWords } from './revision-words';
import type { ReviewActs } from './use-review-acts';

interface SignOffHistoryProps {
  readonly revision: Revision;
  readonly personId: string | null;
  readonly mayWithdrawOwn: boolean;
  readonly mayWithdrawAny: boolean;
  readonly acts: ReviewActs;
}

/** Who signed this revision, up to what, with which conditions; void ones stay, struck. */
export function SignOffHistory({ revision, personId, mayWithdrawOwn, mayWithdrawAny, acts }: SignOffHistoryProps) {
  const [ending, setEnding] = useState<SignOff | null>(null);
  const now = new Date();
  const voltsOf = (signOff: SignOff) => revision.holdPoints.find((point) => point.name === signOff.holdPoint)?.volts ?? 0;
  if (revision.signOffs.length === 0) return null;
  return (
    <section aria-labelledby={`signed-${revision.id}`} className="border-[1.5px] border-ink bg-film text-ink max-tablet:border-x-0">
      <h2 id={`signed-${revision.id}`} className="silk flex min-h-9 items-center border-b-[1.5px] border-ink px-3 text-sm">Sign-offs of {revision.letter}</h2>
      <ul>
        {revision.signOffs.map((signOff) => {
          const gone = voidWords(signOff, now);
          const own = signOff.by.id === personId;
          return (
            <li key={signOff.id} className="grid grid-cols-[auto_1fr_auto] items-start gap-2.5 border-b border-rule px-3 py-2.5 text-md last:border-0 max-tablet:grid-cols-[auto_1fr]">
              <Initials name={signOff.by.name} />
              <div className="min-w-0">
                <p className={gone ? 'text-ink-2 line-through' : 'text-signed-ink'}><span className="text-body font-semibold">To {voltsWords(voltsOf(signOff))}</span> by {signOff.by.name}</p>
                <p className="text-sm text-ink-2"><Moment at={signOff.at} form="medium" />, until <Moment at={signOff.until} form="day" />{gone ? <b className="font-semibold text-ink"> · void: {gone}{signOff.withdrawnBy ? ` by ${signOff.withdrawnBy.name}` : ''}</b> : null}</p>
                {signOff.conditions ? <p className="mt-0.5 text-sm"><PlainText>{signOff.conditions}</PlainText></p> : null}
                {signOff.withdrawReason ? <p className="mt-0.5 text-sm text-caution-ink"><PlainText>{signOff.withdrawReason}</PlainText></p> : null}
              </div>
              {!signOff.withdrawnAt && ((own && mayWithdrawOwn) || mayWithdrawAny) ? <Button size="small" tone="warn" onClick={() => setEnding(signOff)}>Withdraw…</Button> : null}
            </li>
          );
        })}
      </ul>
      {ending ? (
        <ReasonDialog
          title={`Withdraw the sign-off of ${revision.letter} to ${voltsWords(voltsOf(ending))}?`}
          label="Reason, stays on the record"
          required={ending.by.id !== personId}
          keep="Keep it"
          act="Withdraw"
          tone="danger"
          onAct={(reason) => acts.withdraw(ending.id, reason || undefined)}
          onClose={() => setEnding(null)}
        >
          It is void at once and the makers are told. It cannot be undone: {revision.letter} would need a new sign-off.
        </ReasonDialog>
      ) : null}
    </section>
  );
}
