'use client';
import { useSyncExternalStore } from 'react';

const never = () => () => undefined;

/** The reader's zone once the page runs in the browser; UTC in what the server sends. */
function useZone(): string {
  return useSyncExternalStore(never, () => Intl.DateTimeFormat().resolvedOptions().timeZone, () => 'UTC');
}

function sameDay(a: Date, b: Date, zone: string): boolean {
  const day = new Intl.DateTimeFormat('en-CA', { timeZone: zone });
  return day.format(a) === day.format(b);
}

interface MomentProps {
  /** ISO 8601, UTC. */
  readonly at: string;
  /** `short`: the time today, the day otherwise. `full`: day and time with the zone's name. */
  readonly form?: 'short' | 'medium' | 'full' | 'day';
}

/** A moment in the reader's zone, whose name stands in the title. */
export function Moment({ at, form = 'short' }: MomentProps) {
  const zone = useZone();
  const date = new Date(at);
  const day = new Intl.DateTimeFormat('en-GB', { timeZone: zone, day: 'numeric', month: 'short', ...(Math.abs(new Date().getTime() - date.getTime()) > 300 * 86_400_000 ? { year: 'numeric' } : {}) }).format(date);
  const time = new Intl.DateTimeFormat('en-GB', { timeZone: zone, hour: '2-digit', minute: '2-digit' }).format(date);
  const full = new Intl.DateTimeFormat('en-GB', { timeZone: zone, dateStyle: 'long', timeStyle: 'short' }).format(date);
  const named = `${full}, ${zone.replace('_', ' ')}`;
  const words = { short: sameDay(date, new Date(), zone) ? time : day, medium: `${day} ${time}`, full: named, day }[form];
  return <time dateTime={at} title={named} suppressHydrationWarning>{words}</time>;
}
