import type { Circuit } from '../../circuit/circuit';
import { isTransistor, isVoltageSource } from '../../circuit/part-nature';
import { isAlternating } from '../../circuit/source-role';
import { endNets, terminalsOf } from '../../circuit/terminals';
import { walk } from '../../circuit/walk';
import type { NetlistPart } from '../../netlist';
import type { Outcome } from '../rule';
import { everywhere } from './outcome';

const conducting = new Set(['resistor', 'joint', 'coil', 'junction', 'channel']);

/** Nets on which sources stand. */
const sourceNets = (parts: readonly NetlistPart[]): ReadonlySet<string> => new Set(parts.flatMap((part) => endNets(part) ?? []));

/** Source nets that a net reaches without the part, through capacitors or not. */
function reached(circuit: Circuit, part: NetlistPart, start: string, ends: ReadonlySet<string>, through: 'DC' | 'capacitors'): readonly string[] {
  if (ends.has(start)) return [start];
  const steps = walk(circuit.graph, start, {
    through: (edge) => edge.part.id !== part.id && (conducting.has(edge.nature) || (through === 'capacitors' && edge.nature === 'capacitor')),
    stopAt: (net) => ends.has(net),
  });
  return [...steps.keys()].filter((net) => ends.has(net));
}

/** The nets whose difference stresses a part. */
function stressedNets(part: NetlistPart): readonly [string, string] | null {
  if (!isTransistor(part)) return endNets(part);
  const { output, reference } = terminalsOf(part);
  return [output, reference];
}

/**
 * Whether a part has its current or voltage from an alternating source through a capacitor in series alone: no DC path
 * through it joins two source nets, and two DC points cannot decide it (`docs/rules.md`, "States").
 */
export function needsTransient(circuit: Circuit, part: NetlistPart): boolean {
  const alternating = circuit.sources.supplies.filter(isAlternating);
  const nets = stressedNets(part);
  if (alternating.length === 0 || !nets) return false;
  const ends = sourceNets(circuit.netlist.parts.filter(isVoltageSource));
  const [a, b] = nets.map((net) => reached(circuit, part, net, ends, 'DC')) as [readonly string[], readonly string[]];
  if (a.some((one) => b.some((other) => other !== one))) return false;
  const lines = new Set([...sourceNets(alternating)].filter((net) => net !== '0'));
  return nets.some((net) => reached(circuit, part, net, ends, 'capacitors').some((end) => lines.has(end)));
}

/** Undetermined for want of a transient run. */
export const needsTransientOutcome = (part: NetlistPart, what: string, given: Pick<Outcome, 'severity' | 'target' | 'refs'> & Partial<Outcome>): Outcome =>
  everywhere({ outcome: 'undetermined', message: `${part.ref} needs transient: it is fed through a capacitor, and DC points say nothing of its ${what}`, evidence: [], missing: 'needs transient', ...given });
