import type { Netlist, NetlistPart } from '@/lib/netlist/netlist';
import { partBoxOf, pinPlaceOf } from '../geometry/pin-place';
import type { PartRecord } from '../records';
import { orient, turnedFor } from './orient';
import { isControlPin, type Potential } from './potential';

/** Parts that stand together, placed about the block's own origin. */
export interface Block {
  readonly id: string;
  readonly members: readonly { readonly part: NetlistPart; readonly record: PartRecord }[];
}

/** Distance between columns of a gate network, wide enough for the printed words. */
const column = 120;
const drop = 20;
const lift = 80;

/**
 * A transistor with what leads to its control pin: series parts in one row to its left, what hangs from that row to
 * 0 V below it, the drive at the far end. People draw a driver stage so.
 */
export function stageBlock(
  netlist: Netlist, transistor: NetlistPart, claimed: Set<string>, potential: Potential, recordOf: (part: NetlistPart) => PartRecord,
): Block {
  const own = recordOf(transistor);
  const members: { part: NetlistPart; record: PartRecord }[] = [{ part: transistor, record: own }];
  claimed.add(transistor.id);
  const control = Object.keys(transistor.pins).find((pin) => isControlPin(transistor, pin));
  const start = control === undefined ? undefined : pinPlaceOf(own, control);
  if (control === undefined || !start) return { id: transistor.id, members };
  const put = (part: NetlistPart, pin: string, turn: PartRecord['turn'], at: { readonly x: number; readonly y: number }) => {
    const record = { ...recordOf(part), turn };
    const place = pinPlaceOf(record, pin) ?? { x: 0, y: 0 };
    claimed.add(part.id);
    members.push({ part, record: { ...record, x: at.x - place.x, y: at.y - place.y } });
  };
  const free = (net: string) => netlist.parts.filter((part) => !claimed.has(part.id) && Object.keys(part.pins).length === 2 && Object.values(part.pins).includes(net));
  const across = (part: NetlistPart, net: string) => Object.entries(part.pins).find(([, other]) => other !== net) ?? ['', net];
  const pinOn = (part: NetlistPart, net: string) => Object.keys(part.pins).find((pin) => part.pins[pin] === net) ?? '';
  const visited = new Set<string>();
  let net: string | undefined = transistor.pins[control];
  let x = start.x - 30;
  while (net !== undefined && net !== '0' && !potential.fall.has(net) && !visited.has(net)) {
    const here: string = net;
    visited.add(here);
    const hanging = free(here).filter((part) => hangs(part, here, potential));
    for (const part of hanging) {
      const pin = pinOn(part, here);
      put(part, pin, turnedFor(recordOf(part), pin, 'top'), { x: x - 10, y: start.y + drop });
      x -= column;
    }
    const series = free(here).filter((part) => {
      const [, other] = across(part, here);
      return other !== here && other !== '0' && potential.signal.has(other) && !potential.fall.has(other) && !potential.returns.has(other);
    });
    const first = series[0];
    if (!first) break;
    const [, next] = across(first, here) as [string, string];
    let end = x;
    series.filter((part) => across(part, here)[1] === next).forEach((part, index) => {
      const pin = pinOn(part, here);
      const turn = turnedFor(recordOf(part), pin, 'right');
      put(part, pin, turn, { x: x - 10, y: start.y - index * lift });
      const record = members.at(-1)?.record;
      if (record) end = Math.min(end, partBoxOf(record).left);
    });
    x = end - 40;
    net = next;
  }
  return { id: transistor.id, members };
}

/** Whether a part hangs from `net` to 0 V or a drive's return: drawn upright below the row. */
function hangs(part: NetlistPart, net: string, potential: Potential): boolean {
  return Object.values(part.pins).some((other) => other !== net && (other === '0' || potential.returns.has(other)));
}

/** One block for each transistor with its gate network, one for each part that is left. */
export function blocksOf(netlist: Netlist, ordered: readonly NetlistPart[], potential: Potential, recordOf: (part: NetlistPart) => PartRecord): readonly Block[] {
  const claimed = new Set<string>();
  const stages = new Map(netlist.parts.filter((part) => Object.keys(part.pins).some((pin) => isControlPin(part, pin)))
    .map((part) => [part.id, stageBlock(netlist, part, claimed, potential, recordOf)]));
  return ordered.flatMap((part) => {
    const stage = stages.get(part.id);
    if (stage) return [stage];
    if (claimed.has(part.id)) return [];
    const record = recordOf(part);
    return [{ id: part.id, members: [{ part, record: { ...record, turn: orient(part, record, potential) } }] }];
  });
}
