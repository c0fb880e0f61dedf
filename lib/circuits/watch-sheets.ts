import type { Database } from '@/db/client';
import { uncheckedCircuits } from '@/db/queries/circuits';
import { mintCircuit } from '@/lib/access/mint';
import { logger } from '@/lib/log/logger';
import { checkCopy } from '@/lib/review/check-copy';
import { rooms } from '@/lib/rooms/room-client';
import { keepCounts } from './keep-counts';
import { liveNetlist } from './live-netlist';
import { QuietSheets } from './quiet-sheets';

const lookEvery = 1_000;
const mostAtOnce = 100;

/** Checks one sheet for the lists, and tells its open pages when its counts changed. */
async function checkForLists(db: Database, id: string): Promise<void> {
  const circuit = mintCircuit(id);
  const { netlist, seq, contentHash } = await liveNetlist(db, { circuit });
  const { findings } = await checkCopy(netlist);
  await keepCounts(db, circuit, { seq, contentHash, findings });
  await rooms().announce({ circuitId: id, topic: 'circuit' });
}

/**
 * Watches for sheets that have moved on since their last check and checks them, one after the other, in the engine's queue but on
 * nobody's quota. A failure is logged and tried again. Answers how to stop.
 */
export function watchSheets(db: Database): () => void {
  const sheets = new QuietSheets();
  let stopped = false;
  let timer: NodeJS.Timeout | undefined;
  const look = async (): Promise<void> => {
    try {
      for (const id of sheets.due(await uncheckedCircuits(db, mostAtOnce), Date.now())) {
        if (stopped) return;
        await checkForLists(db, id).catch((error: unknown) => logger('checks').warn({ err: error, circuitId: id }, 'a sheet could not be checked'));
        sheets.checked(id);
      }
    } catch (error) {
      logger('checks').warn({ err: error }, 'the sheets to check could not be read');
    }
    if (!stopped) timer = setTimeout(() => void look(), lookEvery).unref();
  };
  void look();
  return () => {
    stopped = true;
    clearTimeout(timer);
  };
}
