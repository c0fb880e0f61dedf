import type { Corner } from '../kinds/kind-engine';

/** `as drawn`, `high`, `low`, `high-z`, `lifted J1` or `off V1`. */
export type DriveState = 'as drawn' | 'high' | 'low' | 'high-z' | `lifted ${string}` | `off ${string}`;

/**
 * Height of the power source in a run: the stated value, 10 % above it, or for AC sources the two DC points at
 * plus and minus √2·V_rms of the band's top (`docs/rules.md`, "States").
 */
export type Level = 'nominal' | '+10 %' | 'peak +' | 'peak -';

/** A combination at which the circuit is examined. `holdPoint` and `scenario` are null for the circuit as drawn. */
export interface PointKey {
  readonly holdPoint: string | null;
  readonly scenario: string | null;
  /** Volts of the hold point's power source, null without a plan. */
  readonly volts: number | null;
  readonly level: Level;
  readonly state: DriveState;
  readonly corner: Corner;
  /** Designator of the control that is high, where a circuit has several; the others are low. */
  readonly control?: string;
  /** Computed with every supply's current limit lifted, because it was active at the same point. */
  readonly limitLifted?: boolean;
}

/** Why a point has no numbers. */
export interface Refusal {
  readonly code: 'precheck' | 'missing-fact' | 'engine' | 'which-source' | 'not-run';
  readonly words: string;
  readonly nodes: readonly string[];
  readonly parts: readonly string[];
}

/** An operating point, by net name and pin reference. Volts against the 0 V net, amps into the pin. */
export interface OperatingPoint {
  readonly volts: Readonly<Record<string, number>>;
  readonly amps: Readonly<Record<string, number>>;
  /** Supplies whose current limit was active. */
  readonly limited: readonly string[];
}

export type PointResult =
  | { readonly key: PointKey; readonly status: 'ok'; readonly op: OperatingPoint }
  | { readonly key: PointKey; readonly status: 'refused'; readonly refusal: Refusal };
