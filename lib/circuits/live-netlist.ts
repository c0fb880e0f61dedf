import type { Database } from '@/db/client';
import { circuitTitle } from '@/db/queries/circuits';
import type { CircuitAccess } from '@/lib/access/gates';
import { sheetToNetlist } from '@/lib/document/nets/sheet-to-netlist';
import type { Netlist } from '@/lib/netlist/netlist';
import { readLiveSheet } from '@/lib/rooms/live-sheet';

/** The canonical netlist of the committed sheet, under the circuit's title, with the seq it was built at. */
export async function liveNetlist(db: Database, { circuit }: Pick<CircuitAccess, 'circuit'>): Promise<{ readonly netlist: Netlist; readonly seq: number; readonly contentHash: string }> {
  const [live, title] = await Promise.all([readLiveSheet(db, circuit), circuitTitle(db, circuit)]);
  return { netlist: sheetToNetlist(live.sheet, title ?? live.sheet.title), seq: live.seq, contentHash: live.contentHash };
}
