import { touchSafeVolts } from '@/components/ladder/ladder-point';
import { drawnNets } from '@/lib/document/nets/drawn-net';
import { sheetToNetlist } from '@/lib/document/nets/sheet-to-netlist';
import type { Sheet } from '@/lib/document/records';

/** Name of the net that each wire and each junction belongs to. */
export function netOfLines(sheet: Sheet): ReadonlyMap<string, string> {
  const netOfPin = new Map(sheetToNetlist(sheet).parts.flatMap((part) => Object.entries(part.pins).map(([pin, net]) => [`${part.id}:${pin}`, net] as const)));
  const names = new Map<string, string>();
  for (const net of drawnNets(sheet)) {
    const name = net.pins.map((pin) => netOfPin.get(`${pin.part}:${pin.pin}`)).find((found) => found !== undefined);
    if (name === undefined) continue;
    for (const id of [...net.wires, ...net.junctions]) names.set(id, name);
  }
  return names;
}

/** True for a net above the touch-safe limit of smooth DC. */
export function isHot(volts: number | undefined): boolean {
  return volts !== undefined && Math.abs(volts) > touchSafeVolts;
}
