'use client';
import { useEffect, useRef, useState } from 'react';
import type { LiveChecker, LiveFindings } from '@/lib/check/live-checker';
import { sheetToNetlist } from '@/lib/document/nets/sheet-to-netlist';
import type { Sheet } from '@/lib/document/records';

/**
 * What the checks say of the sheet as it stands; null before the first answer. The checker and its engine load when the first
 * sheet is there, and checking waits for the frame, so that a drag is never held up.
 */
export function useLiveFindings(sheet: Sheet | null, title: string): LiveFindings | null {
  const [findings, setFindings] = useState<LiveFindings | null>(null);
  const checker = useRef<LiveChecker | null>(null);
  const latest = useRef<Sheet | null>(null);
  const wanted = sheet !== null;

  useEffect(() => {
    if (!wanted) return;
    let over = false;
    let dispose: (() => void) | undefined;
    void import('@/lib/check/browser-checker').then(({ openBrowserChecker }) => {
      if (over) return;
      const opened = openBrowserChecker(setFindings);
      checker.current = opened.checker;
      dispose = opened.dispose;
      if (latest.current) opened.checker.take(sheetToNetlist(latest.current, title));
    });
    return () => { over = true; checker.current = null; dispose?.(); };
  }, [wanted, title]);

  useEffect(() => {
    latest.current = sheet;
    if (!sheet) return;
    const frame = requestAnimationFrame(() => checker.current?.take(sheetToNetlist(sheet, title)));
    return () => cancelAnimationFrame(frame);
  }, [sheet, title]);
  return findings;
}
