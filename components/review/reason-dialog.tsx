'use client';
import { useState, type ReactNode } from 'react';
import { useAct } from '@/components/margin/use-act';
import { Button } from '@/components/ui/button';
import type { ButtonTone } from '@/components/ui/button-style';
import { Dialog } from '@/components/ui/dialog';
import { TextArea } from '@/components/ui/field';

interface ReasonDialogProps {
  readonly title: string;
  /** What follows from it. */
  readonly children: ReactNode;
  readonly label: string;
  readonly required: boolean;
  readonly keep: string;
  readonly act: string;
  readonly tone: ButtonTone;
  readonly onAct: (reason: string) => Promise<unknown>;
  readonly onClose: () => void;
}

/** Confirms an act that cannot be undone and takes its reason, which stays on the record. */
export function ReasonDialog({ title, children, label, required, keep, act, tone, onAct, onClose }: ReasonDialogProps) {
  const [reason, setReason] = useState('');
  const [missing, setMissing] = useState(false);
  const { busy, error, run } = useAct();
  const submit = async () => {
    const given = reason.trim();
    setMissing(required && given === '');
    if (required && given === '') return;
    if (await run(() => onAct(given))) onClose();
  };
  return (
    <Dialog title={title} onClose={onClose} actions={<><Button onClick={onClose}>{keep}</Button><Button tone={tone} busy={busy} onClick={() => void submit()}>{act}</Button></>}>
      <div>{children}</div>
      <TextArea label={label} rows={3} value={reason} maxLength={2_000} onChange={(event) => setReason(event.target.value)} error={missing ? 'Give the reason: it stays on the record.' : error} />
    </Dialog>
  );
}
