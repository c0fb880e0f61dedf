import { ulid } from 'ulid';

export const requestIdHeader = 'x-request-id';

/** The request's id: one that `proxy.ts` (or a trusted proxy) gave in the right form, else a new ULID. */
export function requestId(headers: Pick<Headers, 'get'>): string {
  const given = headers.get(requestIdHeader);
  return given !== null && /^[0-9A-HJKMNP-TV-Z]{26}$/.test(given) ? given : ulid();
}
