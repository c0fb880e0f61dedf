import type { Evidence, Severity } from '../../findings/finding';
import type { PointSet, RunPoint } from '../../points/point-set';
import type { Station } from '../../points/station';
import { pointWords } from './words';

/** One limit of a stress and what passing it means. */
export interface StressLimit {
  readonly severity: Severity;
  readonly limit: number;
  /** Decided at the stated source value, or already when it is passed 10 % above. */
  readonly at: 'stated' | 'raised';
  /** Where the limit comes from. */
  readonly source: string;
}

export interface StressVerdict {
  readonly severity: Severity | null;
  readonly point: RunPoint;
  readonly value: number;
  /** The limit passed; without one, the nearest: the last of the list. */
  readonly limit: StressLimit;
}

/** Stress of a part at one operating point in SI units; undefined where the point says nothing of it. */
export type Measure = (point: RunPoint) => number | undefined;

function largest(points: readonly RunPoint[], measure: Measure): { readonly point: RunPoint; readonly value: number } | null {
  let worst: { point: RunPoint; value: number } | null = null;
  for (const point of points) {
    const value = measure(point);
    if (value !== undefined && Number.isFinite(value) && (worst === null || value > worst.value * (1 + 1e-9))) worst = { point, value };
  }
  return worst;
}

/** Stresses this near to each other are one: leakage and a supply's own ohms make no state worse than another. */
const same = 1e-3;

/** The first point, in planned order, that is as bad as the worst: it needs no lead off and no limit left out to be said. */
function plainest(points: readonly RunPoint[], measure: Measure, worst: { readonly point: RunPoint; readonly value: number }, limit: number) {
  for (const point of points) {
    const value = measure(point);
    if (value !== undefined && value > limit && value >= worst.value * (1 - same)) return { point, value };
  }
  return worst;
}

/**
 * The worst of a stress at one station against its limits, worst limit first. `heat` leaves out points whose currents
 * and watts say nothing. Null where no point gives a number.
 */
export function judgeStress(points: PointSet, station: Station, measure: Measure, limits: readonly StressLimit[], { heat }: { readonly heat: boolean }): StressVerdict | null {
  const usable = points.at(station).filter((point) => !(heat && point.staticOn));
  for (const limit of limits) {
    const judged = limit.at === 'stated' ? usable.filter((point) => point.stated) : usable;
    const worst = largest(judged, measure);
    if (worst && worst.value > limit.limit) return { severity: limit.severity, ...plainest(judged, measure, worst, limit.limit), limit };
  }
  const rest = largest(usable.filter((point) => point.stated), measure);
  return rest ? { severity: null, ...rest, limit: limits[limits.length - 1]! } : null;
}

/** The worst of a stress at a station's stated value alone, without any band. */
export function nominalWorst(points: PointSet, station: Station, measure: Measure, { heat }: { readonly heat: boolean }): number | undefined {
  const usable = points.at(station).filter((point) => point.key.level !== '+10 %' && !(heat && point.staticOn));
  return largest(usable, measure)?.value;
}

/** Evidence of a stress: the number, where it was read, its limit and the limit's source. */
export function stressEvidence(entity: string, quantity: string, unit: string, { point, value, limit }: StressVerdict): Evidence {
  return { entity, quantity, value, unit, source: pointWords(point), limit: limit.limit, limitSource: limit.source };
}

/**
 * Volts of the power source at which a stress that follows it linearly reaches its limit, between the examined ones or
 * just below the lowest; undefined where it cannot be told.
 */
export function crossingVolts(points: PointSet, measure: Measure, limit: number, { heat }: { readonly heat: boolean }): number | undefined {
  const samples = new Map<number, number>();
  for (const point of points.ok) {
    const { volts } = point.station;
    const value = heat && point.staticOn ? undefined : measure(point);
    if (volts === null || value === undefined || !Number.isFinite(value)) continue;
    const at = point.key.level === '+10 %' ? volts * 1.1 : volts;
    samples.set(at, Math.max(samples.get(at) ?? 0, value));
  }
  const sorted = [...samples].sort(([a], [b]) => a - b);
  const index = sorted.findIndex(([, value]) => value > limit);
  if (index < 0 || sorted.length < 2) return undefined;
  const [[v1, y1], [v2, y2]] = index === 0 ? [sorted[0]!, sorted[1]!] : [sorted[index - 1]!, sorted[index]!];
  if (y2 <= y1) return undefined;
  const crossing = v1 + ((limit - y1) * (v2 - v1)) / (y2 - y1);
  return crossing > 0 ? crossing : undefined;
}

/** The `crossing` entry of evidence, empty where it was not worked out. */
export function crossingEvidence(entity: string, volts: number | undefined): readonly Evidence[] {
  return volts === undefined ? [] : [{ entity, quantity: 'crossing', value: volts, unit: 'V', source: 'interpolated between operating points' }];
}

/** Why a station has no number for a stress: the first refusal there, in words. */
export function refusalWords(points: PointSet, station: Station): string {
  return points.refused.find((refused) => refused.station === station)?.refusal.words ?? 'no operating point was computed';
}
