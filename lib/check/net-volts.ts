import type { PointSet } from '@/lib/netlist/points/point-set';

/** Highest volts of each net against 0 V, either way, by hold point; '' without a plan. */
export type NetVolts = Readonly<Record<string, Readonly<Record<string, number>>>>;

/** Highest volts that each net reaches at each hold point, over all states of the drive at the stated value. */
export function voltsByHoldPoint(points: PointSet): NetVolts {
  const volts: Record<string, Record<string, number>> = {};
  for (const { key, op, stated } of points.ok) {
    if (!stated) continue;
    const here = (volts[key.holdPoint ?? ''] ??= {});
    for (const [net, value] of Object.entries(op.volts)) {
      if (Math.abs(value) > Math.abs(here[net] ?? 0)) here[net] = value;
    }
  }
  return volts;
}
