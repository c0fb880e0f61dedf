import { touchSafeVolts, type LadderPoint } from './ladder-point';

/** Logarithmic scale of the ladder: volts to pixels. */
export interface LadderScale {
  readonly x: (volts: number) => number;
  readonly left: number;
  /** Where the plan ends; the scale goes on to the touch-safe limit where the plan stays below it. */
  readonly right: number;
  /** Volts of the marks on the rail; a decade is major. */
  readonly ticks: readonly { readonly volts: number; readonly major: boolean }[];
}

/** Largest of 1, 2 or 5 times a power of ten that lies below `volts`. */
function startBelow(volts: number): number {
  const decade = 10 ** Math.floor(Math.log10(volts));
  const candidates = [decade / 2, decade, 2 * decade, 5 * decade].filter((candidate) => candidate < volts);
  return candidates.at(-1) ?? decade / 2;
}

/**
 * Scale from just below the lowest hold point to the highest, never ending below the touch-safe limit, so that every
 * plan is read against the same limit. `left` and `right` are pixels.
 */
export function ladderScale(points: readonly Pick<LadderPoint, 'peak'>[], left: number, right: number): LadderScale {
  const peaks = points.map((point) => point.peak);
  const from = startBelow(Math.min(touchSafeVolts / 4, ...peaks));
  const to = Math.max(touchSafeVolts * 1.25, ...peaks);
  const perDecade = (right - left) / Math.log10(to / from);
  const x = (volts: number) => left + perDecade * Math.log10(volts / from);
  const ticks = [];
  for (let decade = 10 ** Math.floor(Math.log10(from)); decade < to; decade *= 10) {
    for (let digit = 1; digit < 10; digit += 1) {
      const volts = digit * decade;
      if (volts >= from && volts <= to) ticks.push({ volts, major: digit === 1 });
    }
  }
  return { x, left, right: peaks.length === 0 ? x(to) : x(Math.max(...peaks)), ticks };
}
