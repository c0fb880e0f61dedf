import { database } from '@/db/client';
import { tidyRegularly } from '@/lib/circuits/housekeeping';
import { watchSheets } from '@/lib/circuits/watch-sheets';
import { environment } from '@/lib/env/environment';
import { noteSocketAddresses } from './socket-address';

const shared = globalThis as typeof globalThis & { holdoffBackground?: true };

/** Once for each process; checks and tidying only where there is a database (not while building). */
export function startBackground(): void {
  noteSocketAddresses();
  if (shared.holdoffBackground || !environment().DATABASE_URL || !environment().INTERNAL_SECRET) return;
  shared.holdoffBackground = true;
  watchSheets(database());
  tidyRegularly(database());
}
