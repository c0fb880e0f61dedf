'use client';
import { useEffect, useId, useRef, type ReactNode } from 'react';

interface DialogProps {
  readonly title: string;
  readonly onClose: () => void;
  /** Consequences first, then a field if a reason is wanted. */
  readonly children: ReactNode;
  /** Keep first, act last. */
  readonly actions: ReactNode;
}

/** Only for what cannot be undone. The browser's own modal: focus stays inside, Escape keeps things as they are. */
export function Dialog({ title, onClose, children, actions }: DialogProps) {
  const ref = useRef<HTMLDialogElement>(null);
  const titleId = useId();
  useEffect(() => {
    const dialog = ref.current;
    if (dialog && !dialog.open) dialog.showModal();
    return () => dialog?.close();
  }, []);
  return (
    <dialog
      ref={ref}
      role="alertdialog"
      aria-labelledby={titleId}
      onCancel={(event) => { event.preventDefault(); onClose(); }}
      className="m-auto w-[min(520px,calc(100vw-24px))] border-[1.5px] border-ink bg-film text-ink shadow-lift backdrop:bg-[color-mix(in_srgb,var(--shade)_40%,transparent)]"
    >
      <h2 id={titleId} className="px-4 pt-3.5 font-cond text-xl leading-tight font-semibold">{title}</h2>
      <div className="space-y-3 px-4 pt-1.5 text-md leading-[1.42] text-ink-2">{children}</div>
      <div className="mt-3.5 flex flex-wrap justify-end gap-2 border-t border-rule px-4 py-3.5">{actions}</div>
    </dialog>
  );
}
