/** IEC 62368-1:2018 Table 4, ES1: 60 V DC, 42.4 V peak (`sources.md` 2). */
export const touchSafe = { dcVolts: 60, peakVolts: 42.4, smoothRipple: 0.1 } as const;

export interface Waveshape {
  /** Volts. */
  readonly mean: number;
  readonly peak: number;
  /** Peak-to-peak ripple over the mean, as a fraction; 0 for DC. */
  readonly ripple: number;
}

/**
 * Whether a net is touch-safe: its mean with less than 10 % ripple is at most 60 V, or else its peak is at most 42.4 V.
 * A 30 V rms sine (42.43 V peak) counts as 42.4.
 */
export function isTouchSafe({ mean, peak, ripple }: Waveshape): boolean {
  if (ripple < touchSafe.smoothRipple) return Math.abs(mean) <= touchSafe.dcVolts;
  return Math.abs(peak) <= Math.max(touchSafe.peakVolts, 30 * Math.SQRT2);
}

/** Touch-safe for a source as stated: DC volts, or V rms of a sine. */
export function isSourceTouchSafe(volts: number, alternating: boolean): boolean {
  return alternating
    ? isTouchSafe({ mean: 0, peak: volts * Math.SQRT2, ripple: Infinity })
    : isTouchSafe({ mean: volts, peak: volts, ripple: 0 });
}
