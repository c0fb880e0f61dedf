import type { NetlistPart } from '../netlist';
import type { Graph } from './graph';
import { labelOf } from './part-facts';
import { isVoltageSource } from './part-nature';
import { endNets } from './terminals';

/** A net that a controller's pin sits on, told by parts marked as the inside of that pin. */
export interface ControllerPin {
  readonly net: string;
  /** The other end of the pin's diode or pull-up; null where only its resistance is drawn. */
  readonly rail: string | null;
  /** The pin's own pull-up, when it is drawn. */
  readonly pullUp: NetlistPart | null;
}

function pinOf(graph: Graph, part: NetlistPart): ControllerPin | null {
  const ends = endNets(part);
  const inside = labelOf(part, 'internal');
  if (!ends) return null;
  const [a, b] = ends;
  if (inside === 'pin-protection-diode') {
    const [net, rail] = b === '0' || a === '0' ? [a === '0' ? b : a, a === '0' ? '0' : b] : [a, b];
    return { net, rail, pullUp: null };
  }
  const holdsSource = (net: string) => net === '0' || graph.pinsOn(net).some((pin) => isVoltageSource(pin.part));
  if (inside === 'pin-pull-up') return holdsSource(a) ? { net: b, rail: a, pullUp: part } : { net: a, rail: b, pullUp: part };
  if (inside === 'pin-resistance') return { net: holdsSource(a) ? b : a, rail: null, pullUp: null };
  return null;
}

/** Controller pins of a netlist, one for each net. */
export function findControllerPins(graph: Graph, parts: readonly NetlistPart[]): readonly ControllerPin[] {
  const pins = new Map<string, ControllerPin>();
  for (const part of parts) {
    const pin = pinOf(graph, part);
    if (!pin) continue;
    const known = pins.get(pin.net);
    pins.set(pin.net, { net: pin.net, rail: known?.rail && known.rail !== '0' ? known.rail : pin.rail ?? known?.rail ?? null, pullUp: known?.pullUp ?? pin.pullUp });
  }
  return [...pins.values()];
}
