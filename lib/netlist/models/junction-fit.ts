import { thermalVoltage } from './fitted-model';

/** One point of a forward characteristic at 25 °C. */
export interface ForwardPoint {
  readonly volts: number;
  readonly amps: number;
}

/** Parameters of the diode law V = N·V_T·ln(I/IS + 1) + I·RS. */
export interface JunctionFit {
  /** Saturation current, amps. */
  readonly is: number;
  /** Emission coefficient. */
  readonly n: number;
  /** Series resistance, ohms. */
  readonly rs: number;
}

/** Of the chord's slope between two points this much is laid on the series resistance. */
const chordShare = 0.3;
/** Of one point's volts the series resistance may take no more than this, or nothing is left for the junction. */
const seriesShare = 0.1;

/**
 * Fits two points (the first at the smaller current) exactly. `nMax` keeps the emission coefficient of the kind (LED 4,
 * silicon 2, Schottky 1.2): beyond it the resistance takes the rest. Source: docs/engine.md 3.2; sources.md 13, two-point
 * extraction.
 */
export function fitTwoPoints(low: ForwardPoint, high: ForwardPoint, nMax: number): JunctionFit {
  const volts = high.volts - low.volts;
  const amps = high.amps - low.amps;
  const decade = thermalVoltage * Math.log(high.amps / low.amps);

  let rs = (chordShare * volts) / amps;
  let n = (volts - rs * amps) / decade;
  if (n > nMax) {
    n = nMax;
    rs = (volts - n * decade) / amps;
  } else if (n < 1) {
    n = 1;
    rs = Math.max(0, (volts - decade) / amps);
  }
  return { is: saturationCurrent(low, n, rs), n, rs };
}

/** Fits one point with the emission coefficient and resistance of the kind. */
export function fitOnePoint(point: ForwardPoint, n: number, rs: number): JunctionFit {
  const series = Math.min(rs, (seriesShare * point.volts) / point.amps);
  return { is: saturationCurrent(point, n, series), n, rs: series };
}

function saturationCurrent(point: ForwardPoint, n: number, rs: number): number {
  return point.amps / Math.expm1((point.volts - point.amps * rs) / (n * thermalVoltage));
}

/** Volts of a fitted junction at a current, amps. */
export function junctionVolts(fit: JunctionFit, amps: number): number {
  return fit.n * thermalVoltage * Math.log1p(amps / fit.is) + amps * fit.rs;
}
