'use client';
import { counted } from '@/components/ui/counted';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { CautionsLine } from '@/components/circuit/cautions-line';
import { CircuitFrame } from '@/components/circuit/circuit-frame';
import { useCircuitPlace } from '@/components/circuit/circuit-context';
import { CircuitLoading } from '@/components/circuit/page-state';
import { ReadingRow } from '@/components/circuit/reading-row';
import { useCircuit, useMembers, useRevisionFindings, useRevisions, useThreads } from '@/components/circuit/use-circuit';
import { useShownAt } from '@/components/circuit/use-shown-at';
import { touchSafeVolts } from '@/components/ladder/ladder-point';
import { voltsWords } from '@/components/ladder/plan-words';
import { useAct } from '@/components/margin/use-act';
import { StatusStrip } from '@/components/shell/status-strip';
import { Button } from '@/components/ui/button';
import { ButtonLink } from '@/components/ui/button-link';
import { Moment } from '@/components/ui/moment';
import { OpenPoints } from './open-points';
import { hashWords, revisionWords, shortHash } from './revision-words';
import { ToWhom } from './to-whom';
import { useReviewActs } from './use-review-acts';

/** The step after a cut: what is sent, to whom, what is open. Nothing open stops the asking, only the signing. */
export function AskPage({ letter }: { readonly letter: string }) {
  const { circuitId, bench, person } = useCircuitPlace();
  const router = useRouter();
  const acts = useReviewActs(circuitId);
  const circuit = useCircuit(circuitId);
  const revisions = useRevisions(circuitId);
  const threads = useThreads(circuitId, true);
  const members = useMembers(bench.slug, true);
  const revision = revisions.data?.find((one) => one.letter === letter);
  const findings = useRevisionFindings(revision?.id);
  const [shown, show] = useShownAt(revision?.holdPoints ?? []);
  const [named, setNamed] = useState(false);
  const [reviewers, setReviewers] = useState<readonly string[]>([]);
  const { busy, error, run } = useAct();

  if (!circuit.data || !revisions.data || !revision || !person) {
    return <CircuitLoading error={circuit.error ?? revisions.error ?? (revisions.data && !revision ? new Error(letter) : null)} onRetry={() => { void circuit.refetch(); void revisions.refetch(); }} />;
  }
  const now = new Date();
  const volts = revision.holdPoints.find((point) => point.name === shown)?.volts ?? 0;
  const asked = revision.askedAt !== null;
  const send = async () => {
    if (await run(() => acts.ask(revision.id, named ? reviewers : []))) router.push(`/circuits/${circuitId}/revisions/${letter}`);
  };
  const row = 'grid grid-cols-[96px_1fr] gap-3 border-b border-rule px-3 py-2.5 text-md last:border-0';
  return (
    <CircuitFrame
      title={circuit.data.title}
      under={`Ask for review of ${letter}`}
      tab="revisions"
      letters={revisions.data.map((one) => one.letter)}
      back={{ href: `/circuits/${circuitId}/revisions/${letter}`, words: `Back to revision ${letter}` }}
      ladder={<ReadingRow revisions={revisions.data} revision={revision} shown={shown} onShow={show} findings={findings.data} act={<p><b className="block font-medium text-silk">{revisionWords(revision, now)}</b>{counted(revision.counts.stop, 'stop')}, {counted(revision.counts.caution, 'caution')} stored</p>} />}
      cautions={volts > touchSafeVolts ? <CautionsLine volts={volts} /> : null}
      status={<StatusStrip lamp="caution" state={revisionWords(revision, now)} right={<span>Exactly {letter} is sent, hash <span className="figure">{shortHash(revision.contentHash)}</span></span>} />}
    >
      <div className="flex min-w-0 flex-1 flex-col bg-film text-ink">
        <div className="min-h-0 flex-1 overflow-y-auto px-6 py-2.5 max-tablet:p-0">
          <div className="flex flex-wrap items-baseline gap-x-3 pb-3 max-tablet:p-3.5">
            <h2 className="font-cond text-xl font-semibold tracking-[.01em]">Ask for review of {letter}</h2>
            <p className="text-md text-ink-2">The sheet stays yours to draw on; {letter} stays as it was cut.</p>
          </div>
          <div className="grid grid-cols-[440px_448px_minmax(0,1fr)] items-start gap-6 max-wide:grid-cols-2 max-tablet:grid-cols-1 max-tablet:gap-0">
            <section aria-labelledby="sent" className="border-[1.5px] border-ink max-tablet:border-x-0 max-wide:col-span-full">
              <h3 id="sent" className="silk flex h-9 items-center border-b-[1.5px] border-ink px-3 text-sm">What is sent</h3>
              <dl>
                <div className={row}><dt className="text-ink-2">Revision</dt><dd><span className="text-body">{letter}, cut <Moment at={revision.cutAt} form="medium" /></span><span className="block text-sm text-ink-2">it cannot change any more</span></dd></div>
                <div className={row}><dt className="text-ink-2">Hash</dt><dd className="figure">{hashWords(revision.contentHash)}</dd></div>
                {revision.note ? <div className={row}><dt className="text-ink-2">Note</dt><dd>{revision.note}</dd></div> : null}
                <div className={row}><dt className="text-ink-2">Plan</dt><dd className="figure whitespace-normal">{revision.holdPoints.length === 0 ? 'none: nothing can be signed' : revision.holdPoints.map((point) => voltsWords(point.volts)).join(', ')}</dd></div>
                <div className={row}><dt className="text-ink-2">Checks</dt><dd>run at the cut<span className="block text-sm text-ink-2">{counted(revision.counts.stop, 'stop')}, {counted(revision.counts.caution, 'caution')}, {revision.counts.undetermined} undetermined</span></dd></div>
              </dl>
            </section>
            <ToWhom letter={letter} members={members.data ?? null} contributors={revision.contributors} self={person.id} named={named} onNamed={setNamed} reviewers={reviewers} onReviewers={setReviewers} />
            <OpenPoints findings={findings.data ?? []} threads={threads.data ?? []} plan={revision.holdPoints} circuitId={circuitId} letter={letter} />
          </div>
        </div>
        <div className="flex flex-none flex-wrap items-center gap-3 border-t-[1.5px] border-ink bg-film px-6 py-3 max-tablet:px-3.5">
          <Button tone="primary" size="large" busy={busy} refused={asked ? `${letter} is ${revisionWords(revision, now).replace(/^\p{Lu}/u, (letter) => letter.toLowerCase())}` : named && reviewers.length === 0 ? 'name somebody' : null} reasonBeside onClick={() => void send()}>Ask for review of {letter}</Button>
          <ButtonLink href={`/circuits/${circuitId}/revisions/${letter}`} size="large">Not yet</ButtonLink>
          {error ? <p role="alert" className="text-sm text-stop-ink">{error}</p> : null}
          <p className="ml-auto max-w-[640px] text-sm text-ink-2 max-tablet:hidden">{letter} goes from cut to <b className="font-semibold text-ink">in review</b>. A later revision sent for review supersedes it.</p>
        </div>
      </div>
    </CircuitFrame>
  );
}
