import { absoluteLimit } from '@/lib/auth/session';

export type CookieName = 'session' | 'guest';
const guestDays = 30;

/** `__Host-` binds a cookie to this very host; browsers take it on https only. */
export const cookieName = (name: CookieName, secure: boolean): string => `${secure ? '__Host-' : ''}holdoff-${name}`;

/** `Set-Cookie` of a fresh value. HttpOnly, SameSite=Lax, the whole site. */
export function setCookie(name: CookieName, value: string, secure: boolean): string {
  const seconds = name === 'session' ? absoluteLimit / 1_000 : guestDays * 86_400;
  return `${cookieName(name, secure)}=${value}; Path=/; HttpOnly; SameSite=Lax; Max-Age=${seconds}${secure ? '; Secure' : ''}`;
}

export function clearCookie(name: CookieName, secure: boolean): string {
  return `${cookieName(name, secure)}=; Path=/; HttpOnly; SameSite=Lax; Max-Age=0${secure ? '; Secure' : ''}`;
}

/** The value of one of our cookies in a `Cookie` header. */
export function readCookie(header: string | null, name: CookieName, secure: boolean): string | null {
  const wanted = `${cookieName(name, secure)}=`;
  const found = (header ?? '').split(';').map((entry) => entry.trim()).find((entry) => entry.startsWith(wanted));
  return found ? found.slice(wanted.length) : null;
}
