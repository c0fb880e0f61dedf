import { buildNetlist } from '@/lib/netlist/connectivity/build-netlist';
import { junctionEnd, pinEnd } from '@/lib/netlist/connectivity/end-key';
import type { DrawnPart, NetlistSource } from '@/lib/netlist/connectivity/netlist-source';
import type { KindId } from '@/lib/netlist/kinds/kind-id';
import type { FactValue, Netlist } from '@/lib/netlist/netlist';

/** A netlist from lines `R1 resistor 1 NET 2 0 value=10`: designator, kind, pin and net in turn, facts. Net `0` is 0 V. */
export function netlistOf(lines: string, netFacts: Readonly<Record<string, Record<string, FactValue>>> = {}): Netlist {
  const parts: DrawnPart[] = [];
  const joins: [NetlistSource['joins'][number][0], NetlistSource['joins'][number][1]][] = [];
  const nets = new Set<string>();
  for (const line of lines.split('\n').filter((words) => words.trim() !== '')) {
    const [ref, kind, ...words] = line.trim().split(/\s+/) as [string, KindId, ...string[]];
    const facts = Object.fromEntries(words.filter((word) => word.includes('=')).map((word) => word.split('=') as [string, string]));
    const pins = words.filter((word) => !word.includes('='));
    parts.push({ id: ref, ref, kind, facts, origins: {}, leftOpen: [] });
    for (let index = 0; index < pins.length; index += 2) {
      const net = pins[index + 1] as string;
      nets.add(net);
      joins.push([pinEnd(ref, pins[index] as string), junctionEnd(net)]);
    }
  }
  for (const net of nets) {
    const id = `name ${net}`;
    const facts = netFacts[net] ?? {};
    parts.push({ id, ref: '', kind: 'net-name', facts: { ...facts, name: net }, origins: {}, leftOpen: [] });
    joins.push([pinEnd(id, '1'), junctionEnd(net)]);
  }
  return buildNetlist({ title: 'Deck', parts, joins, scenarios: [], holdPoints: [], models: [], subcircuits: [] });
}
