import type { Circuit } from '../../circuit/circuit';
import { quantityOf } from '../../circuit/part-facts';
import type { NetlistPart } from '../../netlist';
import type { PointSet, RunPoint } from '../../points/point-set';
import type { Station } from '../../points/station';
import { meanSquareVolts, voltsAcross } from './alternating';
import { packageRating, ratingOf, type Rating } from './rating';
import type { Measure, StressLimit } from './stress';

/** Watts at 70 °C by chip size or body (`docs/rules.md` 13; common practice, no source). */
const packageWatts = { '0402': 0.063, '0603': 0.1, '0805': 0.125, axial: 0.25 };

/** Power rating of a resistor at 70 °C: its own, else that of the package it names. */
export const powerRating = (part: NetlistPart): Rating | undefined =>
  ratingOf(part, 'pmax', 'power rating') ?? packageRating(part, packageWatts, 'power rating');

const fullTo = 70;
const noneAt = 155;

/** What is left of a rating at an ambient: full to 70 °C, then falling linearly to nothing at 155 °C (common practice, no source). */
export function derate(rating: Rating, ambient: number): Rating {
  const share = Math.min(1, Math.max(0, (noneAt - ambient) / (noneAt - fullTo)));
  return share === 1 ? rating : { value: rating.value * share, source: `${rating.source}, at ${ambient} °C` };
}

/** Watts of a resistor at a point: mean square volts over its ohms. */
export const resistorWatts = (circuit: Circuit, points: PointSet, part: NetlistPart): Measure => {
  const ohms = quantityOf(part, 'value') ?? 0;
  return (point: RunPoint) => {
    const square = ohms > 0 ? meanSquareVolts(circuit, points, point, part) : undefined;
    return square === undefined ? undefined : square / ohms;
  };
};

/** Volts across a part by magnitude. */
export const magnitudeAcross = (part: NetlistPart): Measure => (point) => {
  const volts = voltsAcross(point, part);
  return volts === undefined ? undefined : Math.abs(volts);
};

export interface HeatShares {
  readonly cautionShare: number;
  readonly adviceShare: number;
}

/** Limits of a resistor's watts at a station, worst first. */
export function heatLimits(rating: Rating, station: Station, { cautionShare, adviceShare }: HeatShares): readonly StressLimit[] {
  const { value, source } = derate(rating, station.ambient);
  return [
    { severity: 'stop', limit: value, at: 'stated', source },
    { severity: 'caution', limit: value * cautionShare, at: 'stated', source: `${cautionShare * 100} % of the ${source}` },
    { severity: 'caution', limit: value, at: 'raised', source },
    { severity: 'advice', limit: value * adviceShare, at: 'stated', source: `${adviceShare * 100} % of the ${source}` },
  ];
}
