import type { NetlistPart } from '../netlist';
import type { Circuit } from './circuit';
import type { Edge } from './graph';
import { isInternal } from './part-nature';
import { railRange } from './rail-range';
import { walk } from './walk';

const wireOhms = 1;

/** Sets no current by itself: joints, coils, channels, junctions in their direction, the inside of pins, mere wires. */
function limitsNothing(edge: Edge, from: string, towardAnode: boolean): boolean {
  if (edge.nature === 'joint' || edge.nature === 'coil' || edge.nature === 'channel') return true;
  if (edge.nature === 'resistor') return isInternal(edge.part) || Number(edge.part.facts.value ?? 0) < wireOhms;
  if (edge.nature !== 'junction') return false;
  return edge.part.kind === 'zener' || (edge.a === from) !== towardAnode;
}

function railsFrom(circuit: Circuit, led: NetlistPart, net: string, towardAnode: boolean): readonly string[] {
  if (circuit.rails.has(net)) return [net];
  const steps = walk(circuit.graph, net, {
    through: (edge, from) => edge.part.id !== led.id && limitsNothing(edge, from, towardAnode),
    stopAt: (reached) => circuit.rails.has(reached),
  });
  return [...steps.keys()].filter((reached) => circuit.rails.has(reached));
}

/** Volts that can stand across an LED with no resistor in the way; null where a resistor, or nothing, is in the path. */
export function unlimitedVolts(circuit: Circuit, led: NetlistPart): number | null {
  const [anode, cathode] = [led.pins.A ?? '', led.pins.K ?? ''];
  const upper = railsFrom(circuit, led, anode, true);
  const lower = railsFrom(circuit, led, cathode, false);
  let worst: number | null = null;
  for (const from of upper) {
    for (const to of lower) {
      if (from === to) continue;
      const volts = (railRange(circuit, from)?.high ?? 0) - (railRange(circuit, to)?.low ?? 0);
      if (volts > 0 && volts > (worst ?? 0)) worst = volts;
    }
  }
  return worst;
}
