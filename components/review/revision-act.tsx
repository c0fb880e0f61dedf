'use client';
import { counted } from '@/components/ui/counted';
import { useCircuitPlace, useMay } from '@/components/circuit/circuit-context';
import { signedTo } from '@/components/circuit/signed-state';
import { pointWords } from '@/components/ladder/plan-words';
import { ButtonLink } from '@/components/ui/button-link';
import type { Revision } from '@/lib/schemas/revision';
import { revisionWords } from './revision-words';

/** What the reader can do with a revision now: ask, review and sign, or read how far it is signed. */
export function RevisionAct({ revision, full = false }: { readonly revision: Revision; readonly full?: boolean }) {
  const { circuitId, person } = useCircuitPlace();
  const may = useMay();
  const now = new Date();
  const to = signedTo(revision, now);
  const path = `/circuits/${circuitId}/revisions/${revision.letter}`;
  const reviewing = revision.state === 'in review' || revision.state === 'changes asked' || revision.state === 'signed off';
  const point = to ? revision.holdPoints.find((one) => one.volts === to.volts) : undefined;
  const wide = full ? 'w-full' : 'self-start';
  const size = full ? 'large' as const : 'regular' as const;
  return (
    <>
      {full ? null : <p><b className="block font-medium text-silk">{point ? `Signed off to ${pointWords(point)}` : revisionWords(revision, now)}</b>{to ? 'A peer’s opinion of this drawing' : `${counted(revision.counts.stop, 'stop')}, ${counted(revision.counts.caution, 'caution')} at the cut`}</p>}
      {revision.state === 'cut' && may('ask for review') ? <ButtonLink href={`${path}/ask`} tone="primary" size={size} className={wide}>Ask for review of {revision.letter}</ButtonLink>
        : reviewing && (may('sign off') || may('ask for changes') || revision.reviewers.some((one) => one.id === person?.id)) ? <ButtonLink href={`${path}/sign`} tone="sign" size={size} className={wide}>Review and sign…</ButtonLink>
          : reviewing && may('read the bench') ? <ButtonLink href={`${path}/sign`} size={size} className={wide}>How far it can be signed</ButtonLink> : null}
    </>
  );
}
