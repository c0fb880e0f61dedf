import { createHash, timingSafeEqual } from 'node:crypto';

const digest = (text: string) => createHash('sha256').update(text).digest();

/** True when an `Authorization: Bearer …` header carries the secret. Takes the same time whatever was sent. */
export function carriesSecret(authorization: string | undefined, secret: string): boolean {
  return timingSafeEqual(digest(authorization ?? ''), digest(`Bearer ${secret}`));
}
