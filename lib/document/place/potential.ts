import type { Netlist, NetlistPart } from '@/lib/netlist/netlist';

/** Pins that decide what a part does and carry no current to speak of. */
export const controlPins: ReadonlySet<string> = new Set(['G', 'B']);

/** Pins of transistors only: a resistor's pins are numbered. */
export const isControlPin = (part: NetlistPart, pin: string): boolean =>
  controlPins.has(pin) && ['nmos', 'pmos', 'npn', 'pnp'].includes(part.kind);

export const sourceKinds: ReadonlySet<string> = new Set(['dc-source', 'dc-supply', 'ac-mains']);
const feedRoles = new Set(['supply', 'mains', 'battery']);

/** Sources that feed the circuit, as opposed to those that drive it. */
export function feedsOf(netlist: Netlist): readonly NetlistPart[] {
  const sources = netlist.parts.filter((part) => sourceKinds.has(part.kind));
  const marked = sources.filter((part) => typeof part.facts.role === 'string' && feedRoles.has(part.facts.role));
  if (marked.length > 0) return marked;
  const unmarked = sources.filter((part) => part.facts.role === undefined);
  return unmarked.length > 0 ? unmarked : sources;
}

/** Parts that lie in a rail without dropping any volts. */
export const inLineKinds: ReadonlySet<string> = new Set(['fuse', 'switch', 'removable-lead', 'plug-contact']);

export interface Potential {
  /** Steps from a supply rail through parts, not through 0 V nor control pins; rails are 0. Absent when none leads there. */
  readonly fall: ReadonlyMap<string, number>;
  /** Steps from a control pin against the signal; nets of control pins are 0. */
  readonly signal: ReadonlyMap<string, number>;
  /** Nets at the minus pin of a drive, other than 0 V. */
  readonly returns: ReadonlySet<string>;
}

/** Where each net stands between supply and 0 V, and how far from the control pin it leads to. */
export function potentialOf(netlist: Netlist): Potential {
  const fall = new Map<string, number>();
  for (const part of feedsOf(netlist)) {
    const rail = part.pins['+'] ?? part.pins.L;
    if (rail && rail !== '0') fall.set(rail, 0);
  }
  for (let grown = -1; grown !== fall.size;) {
    grown = fall.size;
    for (const part of netlist.parts.filter(({ kind }) => inLineKinds.has(kind))) {
      const nets = Object.values(part.pins).filter((net) => net !== '0');
      if (nets.some((net) => fall.get(net) === 0)) nets.forEach((net) => fall.set(net, 0));
    }
  }
  spreadOut(netlist, fall, (part, pin) => !isControlPin(part, pin));
  const signal = new Map<string, number>();
  for (const part of netlist.parts) {
    for (const [pin, net] of Object.entries(part.pins)) if (isControlPin(part, pin) && net !== '0' && fall.get(net) !== 0) signal.set(net, 0);
  }
  const returns = new Set(netlist.parts.filter((part) => part.kind === 'signal-generator' || sourceKinds.has(part.kind))
    .flatMap((part) => part.pins['-'] ?? part.pins.N ?? []).filter((net) => net !== '0' && !fall.has(net) && !signal.has(net)));
  spreadOut(netlist, signal, (part, pin) => Object.keys(part.pins).length === 2 && !returns.has(part.pins[pin] ?? ''));
  return { fall, signal, returns };
}

function spreadOut(netlist: Netlist, reached: Map<string, number>, passes: (part: NetlistPart, pin: string) => boolean): void {
  for (let changed = true; changed;) {
    changed = false;
    for (const part of netlist.parts) {
      const nets = Object.entries(part.pins).filter(([pin, net]) => net !== '0' && passes(part, pin)).map(([, net]) => net);
      const least = Math.min(...nets.map((net) => reached.get(net) ?? Infinity));
      if (least === Infinity) continue;
      for (const net of nets) {
        if ((reached.get(net) ?? Infinity) > least + 1) {
          reached.set(net, least + 1);
          changed = true;
        }
      }
    }
  }
}
