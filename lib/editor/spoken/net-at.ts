import { netWords } from '@/lib/netlist/connectivity/net-words';
import type { Netlist } from '@/lib/netlist/netlist';
import { drawnNetNames } from '../remedy/named-net';
import { drawnNets } from '@/lib/document/nets/drawn-net';
import type { Sheet } from '@/lib/document/records';
import type { Hit } from '../hit-test';

/** Name of the net under a hit, in words; null where there is none. */
export function netAt(sheet: Sheet, netlist: Netlist, hit: Hit): string | null {
  if (hit.on === 'pin') {
    const name = netlist.parts.find((part) => part.id === hit.part)?.pins[hit.pin];
    if (name !== undefined) return netWords(netlist, name);
  }
  if (hit.on === 'nothing' || hit.on === 'part') return null;
  const number = drawnNets(sheet).findIndex((net) => (hit.on === 'pin' ? net.pins.some((pin) => pin.part === hit.part && pin.pin === hit.pin)
    : hit.on === 'junction' ? net.junctions.includes(hit.junction) : net.wires.includes(hit.wire)));
  const name = drawnNetNames(sheet)[number];
  return name === undefined ? null : netWords(netlist, name);
}
