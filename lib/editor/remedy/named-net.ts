import { pinEnd } from '@/lib/netlist/connectivity/end-key';
import { drawnNets, type DrawnNet } from '@/lib/document/nets/drawn-net';
import { sheetToNetlist } from '@/lib/document/nets/sheet-to-netlist';
import type { Sheet } from '@/lib/document/records';

const cache = new WeakMap<Sheet, readonly (string | undefined)[]>();

/** Netlist name of each drawn net, in the order of `drawnNets`; undefined for lines without a part. */
export function drawnNetNames(sheet: Sheet): readonly (string | undefined)[] {
  const known = cache.get(sheet) ?? namesOf(sheet);
  cache.set(sheet, known);
  return known;
}

function namesOf(sheet: Sheet): readonly (string | undefined)[] {
  const names = new Map<string, string>();
  for (const part of sheetToNetlist(sheet).parts) for (const [pin, net] of Object.entries(part.pins)) names.set(pinEnd(part.id, pin), net);
  const parts = new Map(sheet.parts.map((part) => [part.id, part]));
  return drawnNets(sheet).map((net) => {
    for (const pin of net.pins) {
      const name = names.get(pinEnd(pin.part, pin.pin));
      if (name !== undefined) return name;
    }
    const mark = net.pins.map((pin) => parts.get(pin.part)).find((part) => part?.kind === 'zero-volt' || part?.kind === 'net-name');
    if (mark?.kind === 'zero-volt') return '0';
    return typeof mark?.facts.name === 'string' ? mark.facts.name.trim() : undefined;
  });
}

/** Drawn nets that are the net of this name, with their place in `drawnNets`. */
export function drawnNetsNamed(sheet: Sheet, name: string): readonly { readonly number: number; readonly net: DrawnNet }[] {
  const names = drawnNetNames(sheet);
  return drawnNets(sheet).flatMap((net, number) => (names[number] === name ? [{ number, net }] : []));
}

export interface PinName {
  readonly part: string;
  readonly pin: string;
}

/** A net held on to by its pins: names that nobody gave (`N3`) change with every part that is added. */
export interface HeldNet {
  readonly zero: boolean;
  readonly pins: readonly PinName[];
}

/** Takes hold of a net by its name; null when the sheet has none of that name. 0 V is always there. */
export function holdNet(sheet: Sheet, name: string): HeldNet | null {
  const pins = sheetToNetlist(sheet).parts.flatMap((part) => Object.entries(part.pins)
    .filter(([, net]) => net === name).map(([pin]) => ({ part: part.id, pin })));
  return pins.length > 0 || name === '0' ? { zero: name === '0', pins } : null;
}

/** What a held net is called now. */
export function nameOfHeld(sheet: Sheet, held: HeldNet): string | undefined {
  if (held.zero) return '0';
  for (const { part: id, pin } of held.pins) {
    const name = netOfPin(sheet, { part: id, pin });
    if (name !== undefined) return name;
  }
  return undefined;
}

export const netOfPin = (sheet: Sheet, { part, pin }: PinName): string | undefined =>
  sheetToNetlist(sheet).parts.find((one) => one.id === part)?.pins[pin];
