'use client';
import { useSyncExternalStore } from 'react';

/** Whether a media query matches; `fallback` in what the server sends. */
export function useMedia(query: string, fallback: boolean): boolean {
  return useSyncExternalStore(
    (onChange) => {
      const list = window.matchMedia(query);
      list.addEventListener('change', onChange);
      return () => list.removeEventListener('change', onChange);
    },
    () => window.matchMedia(query).matches,
    () => fallback,
  );
}

/** Wide enough for leaders: the breakpoint `wide`. */
export const wideQuery = '(min-width: 1100px)';
/** A phone: below the breakpoint `tablet`. */
export const phoneQuery = '(max-width: 719.98px)';
