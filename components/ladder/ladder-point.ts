/** A hold point as the ladder draws it. */
export interface LadderPoint {
  readonly name: string;
  /** As the plan states it: volts of a DC source, V rms of an AC one. */
  readonly volts: number;
  readonly amps: number;
  /** What the scale shows: `volts` of a DC source, √2 × `volts` of an AC one. */
  readonly peak: number;
}

/** Touch-safe limit of smooth DC, volts (IEC 61201, dry, large contact area). */
export const touchSafeVolts = 60;

/** Hold points of a plan whose sources in `alternating` are AC. */
export function ladderPoints(plan: readonly { readonly name: string; readonly volts: number; readonly amps: number; readonly source?: string }[], alternating: ReadonlySet<string> = new Set()): readonly LadderPoint[] {
  return plan.map(({ name, volts, amps, source }) => ({
    name, volts, amps, peak: source !== undefined && alternating.has(source) ? volts * Math.SQRT2 : volts,
  }));
}
