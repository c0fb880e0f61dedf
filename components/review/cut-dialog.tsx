'use client';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { useAct } from '@/components/margin/use-act';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { TextArea } from '@/components/ui/field';
import { useReviewActs } from './use-review-acts';

interface CutDialogProps {
  readonly circuitId: string;
  readonly letter: string;
  /** Sequence number of the sheet that the person sees: a sheet that moved on refuses the cut. */
  readonly seq: number | undefined;
  readonly onClose: () => void;
}

/** Cuts a revision. It cannot be changed any more, so a word about it is asked for first. */
export function CutDialog({ circuitId, letter, seq, onClose }: CutDialogProps) {
  const router = useRouter();
  const acts = useReviewActs(circuitId);
  const [note, setNote] = useState('');
  const { busy, error, run } = useAct();
  const cut = () => run(async () => {
    const revision = await acts.cut(note.trim(), seq);
    router.push(`/circuits/${circuitId}/revisions/${revision.letter}/ask`);
  });
  return (
    <Dialog title={`Cut revision ${letter}?`} onClose={onClose} actions={<><Button onClick={onClose}>Not yet</Button><Button tone="primary" icon="cut" busy={busy} onClick={() => void cut()}>Cut {letter}</Button></>}>
      <p>The sheet as it is now becomes revision {letter}, checked by the server and stored. It cannot change any more; the sheet stays yours to draw on.</p>
      <TextArea label="What changed, for the reviewers" rows={3} value={note} maxLength={2_000} onChange={(event) => setNote(event.target.value)} error={error} autoFocus />
    </Dialog>
  );
}
