/** One line of the bench's table. */
export interface Figure {
  readonly what: string;
  readonly median: number;
  readonly p95: number;
  readonly n: number;
  readonly unit: 'ms' | 'kB' | '×' | 'fps';
  /** What we aim at, in words, and whether the median meets it. */
  readonly target?: string;
  readonly met?: boolean;
}

/** The value below which the given share of the samples lies (nearest rank). */
export function quantile(samples: readonly number[], share: number): number {
  const sorted = samples.toSorted((a, b) => a - b);
  return sorted[Math.max(0, Math.ceil(share * sorted.length) - 1)] ?? Number.NaN;
}

export function figure(what: string, samples: readonly number[], unit: Figure['unit'], aim?: { readonly atMost: number } | { readonly atLeast: number }): Figure {
  const median = quantile(samples, 0.5);
  const row = { what, median, p95: quantile(samples, 0.95), n: samples.length, unit };
  if (!aim) return row;
  return 'atMost' in aim
    ? { ...row, target: `≤ ${aim.atMost} ${unit}`, met: median <= aim.atMost }
    : { ...row, target: `≥ ${aim.atLeast} ${unit}`, met: median >= aim.atLeast };
}

/** Hands the figures to `scripts/bench.mjs`, one JSON object a line. */
export function report(figures: readonly Figure[]): void {
  for (const row of figures) process.stdout.write(`${JSON.stringify(row)}\n`);
}
