import { Problem } from '@/lib/errors/problem';

const day = 86_400_000;
/** How long a sign-off holds unless its signer chooses. */
export const usualDays = 90;
const mostDays = 366;

/** The moment a sign-off ends: 90 days from now, or what was chosen (a date means its end, UTC), in the future and within a year. */
export function validUntil(chosen: string | undefined, now: Date): Date {
  if (chosen === undefined) return new Date(now.getTime() + usualDays * day);
  const until = /^\d{4}-\d{2}-\d{2}$/.test(chosen) ? new Date(`${chosen}T23:59:59.999Z`) : new Date(chosen);
  const wrong = (message: string) => new Problem('input-wrong', `until: ${message}`, { errors: [{ path: 'until', message }] });
  if (until <= now) throw wrong('This is in the past.');
  if (until.getTime() - now.getTime() > mostDays * day) throw wrong('A sign-off lasts a year at most.');
  return until;
}
