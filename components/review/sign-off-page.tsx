'use client';
import { counted } from '@/components/ui/counted';
import { useQuery } from '@tanstack/react-query';
import Link from 'next/link';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { CautionsLine } from '@/components/circuit/cautions-line';
import { CircuitFrame } from '@/components/circuit/circuit-frame';
import { useCircuitPlace, useMay } from '@/components/circuit/circuit-context';
import { CircuitLoading } from '@/components/circuit/page-state';
import { ReadingRow } from '@/components/circuit/reading-row';
import { stands } from '@/components/circuit/signed-state';
import { useCircuit, useRevisionFindings, useRevisions } from '@/components/circuit/use-circuit';
import { touchSafeVolts } from '@/components/ladder/ladder-point';
import { callApi } from '@/components/query/api';
import { queryKeys } from '@/components/query/keys';
import { StatusStrip } from '@/components/shell/status-strip';
import { useToast } from '@/components/ui/toasts';
import { pageOf } from '@/lib/schemas/page';
import { ownSessionSchema } from '@/lib/schemas/session';
import { ObjectionsPanel } from './objections-panel';
import { ReasonDialog } from './reason-dialog';
import { RefusedPanel } from './refused-panel';
import { HoldPointKeys, RequirementList } from './requirement-list';
import { RequirementTable } from './requirement-table';
import { reasonsAgainst, requirementRows, underReview } from './requirement-words';
import { revisionWords, shortHash } from './revision-words';
import { SignForm } from './sign-form';
import { SignOffHistory } from './sign-off-history';
import { useReviewActs } from './use-review-acts';

/** How far one revision can be signed, and the step that signs it. */
export function SignOffPage({ letter }: { readonly letter: string }) {
  const { circuitId, person } = useCircuitPlace();
  const may = useMay();
  const router = useRouter();
  const toast = useToast();
  const acts = useReviewActs(circuitId);
  const circuit = useCircuit(circuitId);
  const revisions = useRevisions(circuitId);
  const revision = revisions.data?.find((one) => one.letter === letter);
  const findings = useRevisionFindings(revision?.id);
  const sessions = useQuery({ queryKey: queryKeys.sessions(), enabled: person !== null, queryFn: ({ signal }) => callApi('/api/sessions', { answer: pageOf(ownSessionSchema), signal }) });
  const [chosen, setChosen] = useState<string | null>(null);
  const [objecting, setObjecting] = useState(false);

  if (!circuit.data || !revisions.data || !revision || !person) {
    return <CircuitLoading error={circuit.error ?? revisions.error ?? (revisions.data && !revision ? new Error(letter) : null)} onRetry={() => { void circuit.refetch(); void revisions.refetch(); }} />;
  }
  const now = new Date();
  const rows = requirementRows(revision, {
    contributor: revision.contributors.some((one) => one.id === person.id),
    signedInAt: sessions.data?.items.find((session) => session.current)?.signedInAt ?? null,
    now,
  });
  const points = revision.holdPoints;
  const blocked = points.findIndex((point) => reasonsAgainst(rows, point.name).length > 0);
  const open = underReview(revision);
  const free = blocked < 0 ? points.length : blocked;
  const signed = new Set(revision.signOffs.filter((signOff) => stands(signOff, now)).map((signOff) => signOff.holdPoint));
  const suggested = points.slice(0, free).filter((point) => !signed.has(point.name)).at(-1) ?? points[0];
  const holdPoint = chosen ?? suggested?.name ?? null;
  const index = points.findIndex((point) => point.name === holdPoint);
  const point = points[index];
  const mayObject = may('ask for changes') || revision.reviewers.some((one) => one.id === person.id);
  const maySign = may('sign off') || mayObject;
  const refused = !open ? `${letter} is not under review` : !may('sign off') ? 'a mentor who made no part of it signs' : holdPoint !== null && signed.has(holdPoint) ? 'this hold point is signed off' : index >= free ? reasonsAgainst(rows, holdPoint ?? '')[0]?.words.toLowerCase().replace(/^/, 'against it: ') ?? 'a hold point below is refused' : null;
  const undetermined = (findings.data ?? []).filter((finding) => finding.outcome === 'undetermined' && finding.severity === 'stop' && point !== undefined && (finding.fromVolts === null || finding.fromVolts <= point.volts));

  return (
    <CircuitFrame
      title={circuit.data.title}
      under={`Sign-off, revision ${letter}`}
      tab="revisions"
      letters={revisions.data.map((one) => one.letter)}
      back={{ href: `/circuits/${circuitId}/revisions/${letter}`, words: `Back to revision ${letter}` }}
      ladder={<div className="max-tablet:hidden"><ReadingRow revisions={revisions.data} revision={revision} shown={holdPoint} onShow={setChosen} findings={findings.data} act={<p><b className="block font-medium text-silk">{revisionWords(revision, now)}</b>{revision.reviewers.length > 0 ? `asked: ${revision.reviewers.map((one) => one.name).join(', ')}` : 'any mentor who made no part of it'}</p>} /></div>}
      cautions={point && point.volts > touchSafeVolts ? <CautionsLine volts={point.volts} /> : null}
      status={<StatusStrip lamp={revision.state === 'signed off' ? 'ok' : 'caution'} state={revisionWords(revision, now)} notes={[`${counted(revision.counts.stop, 'stop')}, ${counted(revision.counts.caution, 'caution')} stored at the cut`]} right={<span>Signing covers exactly {letter}, hash <span className="figure">{shortHash(revision.contentHash)}</span></span>} />}
    >
      <div className="min-w-0 flex-1 overflow-y-auto bg-film px-6 py-2.5 text-ink max-tablet:p-0">
        <div className="flex flex-wrap items-baseline gap-x-3 pb-2.5 max-tablet:hidden">
          <h2 className="font-cond text-xl font-semibold tracking-[.01em]">How far can {letter} be signed?</h2>
          <p className="text-md text-ink-2">Worked out now, and again when you sign. Stewards are bound too.</p>
          <Link href={`/circuits/${circuitId}/revisions/${letter}`} className="ml-auto text-md text-act underline underline-offset-[3px]">See revision {letter}</Link>
        </div>
        {points.length === 0 ? <p className="p-4 text-body">This revision has no power-up plan, so nothing can be signed. A maker sets one on the sheet and cuts a new revision.</p> : (
          <>
            <div className="max-tablet:hidden"><RequirementTable revision={revision} rows={rows} free={open ? free : 0} chosen={holdPoint} signed={signed} onChoose={maySign ? setChosen : null} /></div>
            <div className="tablet:hidden">
              <div className="p-3"><HoldPointKeys revision={revision} free={free} signed={signed} chosen={holdPoint} onChoose={setChosen} /></div>
              {holdPoint ? <RequirementList rows={rows} holdPoint={holdPoint} /> : null}
            </div>
          </>
        )}
        <div className="mt-3.5 grid grid-cols-2 items-start gap-6 pb-4 max-wide:grid-cols-1 max-wide:gap-3.5 max-tablet:mt-0">
          {maySign ? <SignForm key={holdPoint} revision={revision} holdPoint={holdPoint} refused={refused} person={person} undetermined={undetermined} acts={acts} onSigned={() => { toast(`Signed off. ${letter} alone is covered.`); router.push(`/circuits/${circuitId}/revisions/${letter}`); }} onAskForChanges={mayObject && revision.state !== 'signed off' && open ? () => setObjecting(true) : null} /> : null}
          <div className="space-y-3.5">
            <RefusedPanel revision={revision} rows={rows} free={free} circuitId={circuitId} />
            <ObjectionsPanel objections={revision.objections} personId={person.id} mayOverride={may('override an objection')} acts={acts} />
            <SignOffHistory revision={revision} personId={person.id} mayWithdrawOwn={may('sign off')} mayWithdrawAny={may('withdraw another’s sign-off')} acts={acts} />
          </div>
        </div>
      </div>
      {objecting ? (
        <ReasonDialog title={`Ask for changes to ${letter}?`} label="What must change, and why" required keep="Not yet" act="Ask for changes" tone="danger" onAct={(reason) => acts.object(revision.id, reason)} onClose={() => setObjecting(false)}>
          Nobody can sign this circuit, whichever revision, until you lift it or a steward overrides it with a reason.
        </ReasonDialog>
      ) : null}
    </CircuitFrame>
  );
}
