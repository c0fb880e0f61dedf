import { database } from '@/db/client';
import { demoCircuit } from '@/db/queries/guest-links';

/** Where the landing page's circuit opens for anybody, read only; null where nothing is seeded or the database does not answer. */
export async function demoHref(): Promise<string | null> {
  try {
    return await demoCircuit(database()) ? '/open/demo' : null;
  } catch {
    return null;
  }
}
