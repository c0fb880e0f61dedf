import type { NetlistPart } from '../netlist';
import type { Circuit } from './circuit';
import { quantityOf } from './part-facts';
import { isAlternating, rmsOf } from './source-role';
import { endNets } from './terminals';
import { walk } from './walk';

/** Lowest and highest volts that a net can stand at. */
export interface VoltRange {
  readonly low: number;
  readonly high: number;
}

/** What a source can be set to over drawing, plan, scenarios and drive states. */
function sourceRange(circuit: Circuit, part: NetlistPart): VoltRange {
  const control = circuit.sources.controls.find((candidate) => candidate.part.id === part.id);
  if (control) return { low: control.low, high: control.high };
  const { holdPoints, scenarios } = circuit.netlist;
  const stated = isAlternating(part) ? rmsOf(part) : quantityOf(part, 'value');
  const planned = circuit.sources.power?.id === part.id || holdPoints.some((point) => point.source === part.ref)
    ? holdPoints.filter((point) => point.source === undefined || point.source === part.ref).map((point) => point.volts) : [];
  const set = scenarios.flatMap((scenario) => scenario.values[part.ref]?.volts ?? []);
  const all = planned.length > 0 ? [...planned, ...set] : [...set, ...(stated === undefined ? [] : [stated])];
  if (all.length === 0) return { low: 0, high: 0 };
  const peak = Math.max(...all.map(Math.abs)) * Math.SQRT2;
  return isAlternating(part) ? { low: -peak, high: peak } : { low: Math.min(...all), high: Math.max(...all) };
}

/** Range of a rail, or of a net that joints tie to one, against 0 V; null for any other net. */
export function railRange(circuit: Circuit, net: string): VoltRange | null {
  if (net === '0') return { low: 0, high: 0 };
  if (!circuit.stiff.has(net)) return null;
  const steps = walk(circuit.graph, '0', { through: ({ nature }) => nature === 'source' || nature === 'joint' });
  let range: VoltRange = { low: 0, high: 0 };
  for (let step = steps.get(net); step?.via; step = step.from === null ? undefined : steps.get(step.from)) {
    if (step.via.nature !== 'source') continue;
    const source = sourceRange(circuit, step.via.part);
    const forward = (endNets(step.via.part) ?? [])[0] === step.net;
    range = forward
      ? { low: range.low + source.low, high: range.high + source.high }
      : { low: range.low - source.high, high: range.high - source.low };
  }
  return range;
}

/** Highest volts of any rail. */
export function highestRail(circuit: Circuit): number {
  return Math.max(0, ...[...circuit.rails].map((net) => railRange(circuit, net)?.high ?? 0));
}
