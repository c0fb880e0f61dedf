import type { NetlistPart } from '../netlist';
import type { Circuit } from './circuit';
import { acrossFrom, type Edge } from './graph';
import { isInductive, isTransistor, isUpperPolarity, ohmsOf } from './part-nature';
import type { Stage } from './stages';
import { terminalsOf } from './terminals';
import { pathTo, walk, type Step } from './walk';

/** A coil whose current a transistor interrupts. */
export interface SwitchedCoil {
  readonly coil: NetlistPart;
  readonly stage: Stage;
  /** `low`: the switch sits at the coil's lower end, which rises when it opens; `high`: at its upper end, which falls. */
  readonly side: 'low' | 'high';
  /** Nets between switch and coil. */
  readonly near: ReadonlySet<string>;
  /** Nets beyond the coil, up to a rail. */
  readonly far: ReadonlySet<string>;
  /** The coil's own ends: toward the switch, and away from it. */
  readonly ends: readonly [near: string, far: string];
  /** Ohms in series with the coil on the way to a rail, its own included; 0 when nothing is known. */
  readonly seriesOhms: number;
}

const carries = new Set(['resistor', 'joint', 'open', 'coil']);

/** Whether anything ever turns the transistor off: a stage tied to rails alone does not switch. */
function switches(circuit: Circuit, stage: Stage): boolean {
  if (stage.control) return true;
  return [...stage.reach.keys()].filter((net) => !circuit.rails.has(net)).some((net) => circuit.graph.pinsOn(net)
    .some(({ part, pin }) => part.kind === 'box' || part.kind === 'switch' || part.kind === 'diode' || (isTransistor(part) && pin !== terminalsOf(part).controlPin)
      || isInductive(part)) || circuit.controllerPins.some((pin) => pin.net === net));
}

function beyond(circuit: Circuit, coil: Edge, start: string): ReadonlyMap<string, Step> {
  const atRail = circuit.rails.has(start);
  return walk(circuit.graph, start, {
    through: (edge) => !atRail && edge.part.id !== coil.part.id && carries.has(edge.nature),
    stopAt: (net) => circuit.rails.has(net),
  });
}

function coilsFrom(circuit: Circuit, stage: Stage, start: string, side: 'low' | 'high', gates: ReadonlySet<string>): readonly SwitchedCoil[] {
  if (circuit.rails.has(start)) return [];
  const steps = walk(circuit.graph, start, {
    through: (edge) => carries.has(edge.nature) && edge.part.id !== stage.transistor.id,
    stopAt: (net) => circuit.rails.has(net) || gates.has(net),
  });
  const found: SwitchedCoil[] = [];
  for (const step of steps.values()) {
    if (!step.via || step.from === null || !isInductive(step.via.part)) continue;
    const way = pathTo(steps, step.net);
    const near = new Set<string>([start]);
    let at = start;
    for (const edge of way.slice(0, -1)) {
      at = acrossFrom(edge, at);
      near.add(at);
    }
    const away = beyond(circuit, step.via, step.net);
    const rail = [...away.keys()].find((net) => circuit.rails.has(net));
    found.push({
      coil: step.via.part, stage, side, near, far: new Set([...away.keys()].filter((net) => !near.has(net))), ends: [step.from, step.net],
      seriesOhms: [...way, ...(rail === undefined ? [] : pathTo(away, rail))].reduce((sum, edge) => sum + ohmsOf(edge.part), 0),
    });
  }
  return found;
}

/** Coils in series with the current-carrying terminals of a stage that switches. */
export function switchedCoils(circuit: Circuit, stage: Stage): readonly SwitchedCoil[] {
  if (!switches(circuit, stage)) return [];
  const { terminals, transistor } = stage;
  const gates = new Set(circuit.stages.map((other) => other.terminals.control));
  const upper = isUpperPolarity(transistor);
  return [
    ...coilsFrom(circuit, stage, terminals.output, upper ? 'high' : 'low', gates),
    ...coilsFrom(circuit, stage, terminals.reference, upper ? 'low' : 'high', gates),
  ];
}
