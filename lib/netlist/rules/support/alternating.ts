import type { Circuit } from '../../circuit/circuit';
import { endNets } from '../../circuit/terminals';
import type { NetlistPart } from '../../netlist';
import { alternatingBandTop } from '../../points/plan-points';
import { voltsOf, type PointSet, type RunPoint } from '../../points/point-set';

/** Volts across a two-pin part at a point, first end against second; undefined for other parts. */
export function voltsAcross(point: RunPoint, part: NetlistPart): number | undefined {
  const ends = endNets(part);
  if (!ends) return undefined;
  const volts = voltsOf(point, ends[0]) - voltsOf(point, ends[1]);
  return Number.isFinite(volts) ? volts : undefined;
}

/** The point at the other peak with the same state, for a point at a peak of an alternating source. */
export function otherPeak(points: PointSet, point: RunPoint): RunPoint | undefined {
  const level = point.key.level === 'peak +' ? 'peak -' : point.key.level === 'peak -' ? 'peak +' : null;
  if (level === null) return undefined;
  return points.at(point.station).find(({ key }) => key.level === level && key.state === point.key.state
    && key.control === point.key.control && key.limitLifted === point.key.limitLifted);
}

/**
 * Mean of V² across a part over a cycle, from the two peaks: half the sum of the squares of the half waves for what
 * swings with the source, the square at the peak for what a capacitor smooths (`docs/rules.md`, "States").
 */
export function meanSquareVolts(circuit: Circuit, points: PointSet, point: RunPoint, part: NetlistPart): number | undefined {
  const volts = voltsAcross(point, part);
  if (volts === undefined) return undefined;
  const other = otherPeak(points, point);
  if (!other) return volts * volts;
  const opposite = voltsAcross(other, part) ?? 0;
  const smoothed = volts * opposite > 0 && (endNets(part) ?? []).some((net) => net !== '0' && circuit.smoothedNets.has(net));
  return smoothed ? volts * volts : (volts * volts + opposite * opposite) / 4 / (alternatingBandTop * alternatingBandTop);
}
