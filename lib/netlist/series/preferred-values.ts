/** IEC 60063 series up to E24, which carry the historical exceptions; two significant digits. */
const e6 = [10, 15, 22, 33, 47, 68];
const e12 = [10, 12, 15, 18, 22, 27, 33, 39, 47, 56, 68, 82];
const e24 = [10, 11, 12, 13, 15, 16, 18, 20, 22, 24, 27, 30, 33, 36, 39, 43, 47, 51, 56, 62, 68, 75, 82, 91];

/** E48 and E96 are round(100·10^(i/N)), three significant digits (IEC 60063). */
function geometric(steps: number): number[] {
  return Array.from({ length: steps }, (_, step) => Math.round(100 * 10 ** (step / steps)));
}

/** Values of one decade in hundredths: 100 … 999. */
const hundredths = {
  E6: e6.map((value) => value * 10), E12: e12.map((value) => value * 10), E24: e24.map((value) => value * 10),
  E48: geometric(48), E96: geometric(96),
} as const;

export type SeriesName = keyof typeof hundredths;

/** The numbers of one decade of an IEC 60063 series, from 1 up to but not including 10. */
export function decadeOf(series: SeriesName): readonly number[] {
  return hundredths[series].map((value) => value / 100);
}

/** Values are compared with this relative slack, so that 4700 computed as 4699.999… is 4700. */
const slack = 1e-9;

const ladders = new Map<string, readonly number[]>();

/** The series' values of a decade and of those beside it, each the number that its digits read as; worked out once. */
function ladder(series: SeriesName, decade: number): readonly number[] {
  const key = `${series} ${decade}`;
  const known = ladders.get(key);
  if (known) return known;
  const made = [decade - 1, decade, decade + 1].flatMap((power) => hundredths[series].map((step) => Number(`${step}e${power - 2}`)));
  ladders.set(key, made);
  return made;
}

/** Preferred value just under (or at) and just over (or at) `value`, both the same when it is one. `value` > 0. */
export function neighbours(value: number, series: SeriesName): readonly [below: number, above: number] {
  if (!(value > 0) || !Number.isFinite(value)) throw new RangeError('Preferred values are positive');
  const decade = Math.floor(Math.log10(value) + slack);
  const steps = ladder(series, decade);
  const below = steps.findLast((step) => step <= value * (1 + slack)) as number;
  const above = steps.find((step) => step >= value * (1 - slack)) as number;
  return [below, above];
}

/** The preferred value with the smallest difference; the larger one at the very middle. */
export function nearest(value: number, series: SeriesName): number {
  const [below, above] = neighbours(value, series);
  return value - below < above - value ? below : above;
}

/** The smallest preferred value that is not below `value`. */
export function nearestUp(value: number, series: SeriesName): number {
  return neighbours(value, series)[1];
}

export function isPreferred(value: number, series: SeriesName): boolean {
  const [below, above] = neighbours(value, series);
  return below === above;
}
