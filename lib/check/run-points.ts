import type { Circuit } from '@/lib/netlist/circuit/circuit';
import type { PointEngine } from '@/lib/netlist/engine-deck/engine-port';
import { runPoint } from '@/lib/netlist/engine-deck/run-point';
import { planPoints, withoutLimit, type PointSpec } from '@/lib/netlist/points/plan-points';
import type { PointResult } from '@/lib/netlist/points/point';
import { buildPointSet, type PointSet } from '@/lib/netlist/points/point-set';
import type { Station } from '@/lib/netlist/points/station';

interface Ran {
  readonly spec: PointSpec;
  readonly result: PointResult;
}

async function runSpec(circuit: Circuit, engine: PointEngine, spec: PointSpec): Promise<Ran> {
  const { key, refusal } = spec;
  if (refusal) return { spec, result: { key, status: 'refused', refusal } };
  const run = await runPoint(engine, circuit.netlist, {
    settings: spec.settings, corner: spec.corner, ...(spec.ambient === undefined ? {} : { ambient: spec.ambient }),
  });
  return { spec, result: run.status === 'ok' ? { key, status: 'ok', op: run.op } : { key, status: 'refused', refusal: run.refusal } };
}

/**
 * Every operating point that the rules need at these stations. Where a supply's current limit was active the point is
 * computed without it as well: a limit never turns a fail into a pass.
 */
export async function runPoints(circuit: Circuit, engine: PointEngine, stations: readonly Station[]): Promise<PointSet> {
  const first = await Promise.all(planPoints(circuit, stations).map((spec) => runSpec(circuit, engine, spec)));
  const again = first.flatMap(({ spec, result }) => (result.status === 'ok' && result.op.limited.length > 0 ? [withoutLimit(spec, result.op.limited, circuit)] : []));
  const second = await Promise.all(again.map((spec) => runSpec(circuit, engine, spec)));
  return buildPointSet(circuit, stations, [...first, ...second].map(({ spec, result }) => ({ station: spec.station, result })));
}
