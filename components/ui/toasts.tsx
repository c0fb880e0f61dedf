'use client';
import { createContext, useCallback, useContext, useMemo, useState, type ReactNode } from 'react';

interface Toast {
  readonly id: number;
  readonly words: string;
}

const ToastContext = createContext<(words: string) => void>(() => undefined);

/** Says in passing what was done. Never for anything that needs an answer. */
export function useToast(): (words: string) => void {
  return useContext(ToastContext);
}

const shownFor = 5_000;

export function ToastProvider({ children }: { readonly children: ReactNode }) {
  const [toasts, setToasts] = useState<readonly Toast[]>([]);
  const show = useCallback((words: string) => {
    const id = Date.now() + Math.random();
    setToasts((all) => [...all.slice(-2), { id, words }]);
    window.setTimeout(() => setToasts((all) => all.filter((toast) => toast.id !== id)), shownFor);
  }, []);
  const value = useMemo(() => show, [show]);
  return (
    <ToastContext value={value}>
      {children}
      <div role="status" className="pointer-events-none fixed bottom-10 left-4 z-50 flex flex-col gap-2 max-tablet:right-4 max-tablet:bottom-20 print:hidden">
        {toasts.map((toast) => (
          <p key={toast.id} className="rounded-box bg-ink px-3 py-2 text-body text-film shadow-lift">{toast.words}</p>
        ))}
      </div>
    </ToastContext>
  );
}
