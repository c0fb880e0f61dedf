/** A waveform on an uneven grid. */
export interface Waveform {
  readonly axis: Float64Array;
  readonly values: Float64Array;
}

/** Value at a point of the axis, straight between two samples. */
export function valueAt({ axis, values }: Waveform, at: number): number {
  const after = axis.findIndex((point) => point >= at);
  if (after <= 0) return values[Math.max(after, 0)] ?? Number.NaN;
  const [x0, x1] = [axis[after - 1] as number, axis[after] as number];
  const [y0, y1] = [values[after - 1] as number, values[after] as number];
  return y0 + ((y1 - y0) * (at - x0)) / (x1 - x0);
}

/** Where the waveform first passes a level, from `from` on. */
export function crossing({ axis, values }: Waveform, level: number, direction: 'up' | 'down', from = -Infinity): number {
  for (let index = 1; index < axis.length; index += 1) {
    const [x0, x1] = [axis[index - 1] as number, axis[index] as number];
    const [y0, y1] = [values[index - 1] as number, values[index] as number];
    if (x1 < from) continue;
    const passes = direction === 'up' ? y0 < level && y1 >= level : y0 > level && y1 <= level;
    if (passes) return x0 + ((x1 - x0) * (level - y0)) / (y1 - y0);
  }
  return Number.NaN;
}

/** Largest and smallest value from a point of the axis on. */
export function rangeFrom({ axis, values }: Waveform, from: number): { readonly min: number; readonly max: number; readonly mean: number } {
  const first = axis.findIndex((point) => point >= from);
  let [min, max, area] = [Infinity, -Infinity, 0];
  for (let index = first; index < axis.length; index += 1) {
    const value = values[index] as number;
    min = Math.min(min, value);
    max = Math.max(max, value);
    if (index > first) area += (((axis[index] as number) - (axis[index - 1] as number)) * (value + (values[index - 1] as number))) / 2;
  }
  return { min, max, mean: area / ((axis[axis.length - 1] as number) - (axis[first] as number)) };
}
