/** Where to go after signing in: a path of this site only, else the fallback. */
export function returnPath(value: string | null | undefined, fallback = '/benches'): string {
  if (!value || value.length > 500 || !/^\/(?![/\\])[^\\\p{Cc}\s]*$/u.test(value)) return fallback;
  const base = 'http://site.invalid';
  const url = new URL(value, base);
  return url.origin === base && !url.pathname.startsWith('//') ? `${url.pathname}${url.search}${url.hash}` : fallback;
}
