import type { NetlistPart } from '../netlist';
import type { Circuit } from './circuit';
import type { SwitchedCoil } from './coils';
import { acrossFrom, type Edge } from './graph';
import { quantityOf } from './part-facts';
import { isFet } from './part-nature';
import { pathTo, walk } from './walk';

/** What takes a coil's current when its switch opens. */
export interface Clamp {
  readonly parts: readonly NetlistPart[];
  readonly kind: 'diode' | 'zener' | 'capacitor';
  /** Volts that the clamp adds to what the switch already blocks. */
  readonly volts: number;
}

const flybackVolts = 1;

/** From anode to cathode when met at `from`. The body diode of a FET leads from source to drain (P-channel: drain to source). */
function leadsForward(edge: Edge, from: string): boolean {
  if (edge.nature === 'channel') return edge.part.kind === 'nmos' ? edge.b === from : edge.a === from;
  return edge.a === from;
}

function mayPass({ side, stage, coil }: SwitchedCoil, edge: Edge, from: string): boolean {
  if (edge.part.id === coil.id) return false;
  if (edge.nature === 'resistor' || edge.nature === 'joint' || edge.nature === 'capacitor') return true;
  if (edge.part.kind === 'led') return false;
  if (edge.part.kind === 'zener') return true;
  if (edge.nature === 'junction') return leadsForward(edge, from) === (side === 'low');
  if (edge.nature === 'channel') return isFet(edge.part) && edge.part.id !== stage.transistor.id && leadsForward(edge, from) === (side === 'low');
  return false;
}

/** How a path clamps, by what lies in it; null for resistors and joints alone. */
function clampOf(path: readonly Edge[], start: string, side: 'low' | 'high'): Clamp | null {
  const parts = path.map((edge) => edge.part);
  let at = start;
  let breakdown = 0;
  let forward = false;
  for (const edge of path) {
    if (edge.part.kind === 'zener' && leadsForward(edge, at) !== (side === 'low')) breakdown += quantityOf(edge.part, 'vz') ?? 0;
    if (edge.nature === 'junction' || edge.nature === 'channel') forward = true;
    at = acrossFrom(edge, at);
  }
  if (parts.some((part) => part.kind === 'capacitor' || part.kind === 'polarised-capacitor')) return { parts, kind: 'capacitor', volts: 0 };
  if (breakdown > 0) return { parts, kind: 'zener', volts: breakdown };
  return forward ? { parts, kind: 'diode', volts: flybackVolts } : null;
}

/**
 * A capacitor between two nets that coils join to the switch: a tank, in which the coil's current swings on (a choke that
 * feeds the middle of a self-oscillating pair, a work coil with its capacitor).
 */
export function tankOf(circuit: Circuit, { coil, near }: SwitchedCoil): NetlistPart | null {
  const nets = new Set([...near].flatMap((start) => [...walk(circuit.graph, start, {
    through: (edge) => edge.part.id !== coil.id && (edge.nature === 'coil' || edge.nature === 'joint'),
    stopAt: (net) => circuit.rails.has(net),
  }).keys()].filter((net) => !circuit.rails.has(net))));
  return circuit.graph.edges.find((edge) => edge.nature === 'capacitor' && nets.has(edge.a) && nets.has(edge.b))?.part ?? null;
}

/** Clamps of a coil: across it, to a rail, or across its switch. */
export function clampsOf(circuit: Circuit, switched: SwitchedCoil): readonly Clamp[] {
  const { near, far, stage, side } = switched;
  const gates = new Set(circuit.stages.map((other) => other.terminals.control));
  const tank = tankOf(circuit, switched);
  const found: Clamp[] = tank ? [{ parts: [tank], kind: 'capacitor', volts: 0 }] : [];
  for (const start of near) {
    const steps = walk(circuit.graph, start, {
      through: (edge, from) => mayPass(switched, edge, from),
      stopAt: (net) => circuit.rails.has(net) || far.has(net) || stage.references.has(net) || gates.has(net),
    });
    for (const net of steps.keys()) {
      if (net === start || near.has(net) || gates.has(net)) continue;
      const atReference = stage.references.has(net);
      if (!far.has(net) && !circuit.rails.has(net) && !atReference) continue;
      const clamp = clampOf(pathTo(steps, net), start, side);
      const lowerRail = side === 'low' ? net === '0' : false;
      if (clamp && !(clamp.kind === 'diode' && (atReference || lowerRail) && !far.has(net))) found.push(clamp);
    }
  }
  return found;
}

/** Diodes across a coil that conduct while its switch is on. */
export function reversedDiodes(circuit: Circuit, { coil, near, far, side }: SwitchedCoil): readonly NetlistPart[] {
  const joined = (nets: ReadonlySet<string>) => new Set([...nets].flatMap((net) => [...walk(circuit.graph, net, { through: ({ nature }) => nature === 'joint' }).keys()]));
  const [nearNets, farNets] = [joined(near), joined(far)];
  return circuit.graph.edges.filter((edge) => {
    if (edge.nature !== 'junction' || edge.part.kind === 'led' || edge.part.id === coil.id) return false;
    const [positive, negative] = side === 'low' ? [farNets, nearNets] : [nearNets, farNets];
    return positive.has(edge.a) && negative.has(edge.b) && !negative.has(edge.a);
  }).map((edge) => edge.part);
}
