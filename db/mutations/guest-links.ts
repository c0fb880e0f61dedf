import { ulid } from 'ulid';
import type { Executor } from '../client';
import { guestLinks } from '../schema/circuits';

export interface NewGuestLink {
  readonly circuit: string;
  readonly tokenHash: string;
  readonly madeBy: string;
  /** True for the link behind the landing page. */
  readonly demo: boolean;
  readonly expiresAt: Date;
}

export async function insertGuestLink(db: Executor, link: NewGuestLink): Promise<string> {
  const id = ulid();
  await db.insert(guestLinks).values({ id, circuitId: link.circuit, tokenHash: link.tokenHash, madeBy: link.madeBy, demo: link.demo ? 1 : 0, expiresAt: link.expiresAt });
  return id;
}
