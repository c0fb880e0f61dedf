'use client';
import { usePathname, useSearchParams } from 'next/navigation';
import { useCallback } from 'react';

/**
 * Name of the hold point at which things are shown: `?at=` in the address, else the highest of the plan. Choosing one changes the
 * address without a new entry in the history.
 */
export function useShownAt(plan: readonly { readonly name: string }[]): readonly [string | null, (name: string) => void] {
  const params = useSearchParams();
  const path = usePathname();
  const wanted = params.get('at');
  const shown = plan.find((point) => point.name === wanted)?.name ?? plan.at(-1)?.name ?? null;
  const show = useCallback((name: string) => {
    const next = new URLSearchParams(window.location.search);
    next.set('at', name);
    window.history.replaceState(null, '', `${path}?${next}${window.location.hash}`);
  }, [path]);
  return [shown, show];
}
