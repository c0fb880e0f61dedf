import { quantityOf } from '../../circuit/part-facts';
import type { NetlistPart } from '../../netlist';
import { packageRating, ratingOf, type Rating } from './rating';

/** Working volts by chip size (`docs/rules.md` 46). */
const packageVolts = { '0402': 50, '0603': 75, '0805': 150, '1206': 200 };
/** Working volts of an axial film resistor by its watts (`docs/rules.md` 46). */
const axialVolts: readonly (readonly [watts: number, volts: number])[] = [[0.5, 350], [0.25, 250]];

function axialRating(part: NetlistPart): Rating | undefined {
  if (typeof part.facts.package !== 'string' || part.facts.package.toLowerCase() !== 'axial') return undefined;
  const watts = quantityOf(part, 'pmax') ?? 0.25;
  const row = axialVolts.find(([least]) => watts >= least);
  return row ? { value: row[1], source: `voltage rating of a ${row[0]} W axial part, common practice` } : undefined;
}

/** Voltage rating of a resistor: its own, else that of the package it names; undefined when neither says. */
export const voltageRating = (part: NetlistPart): Rating | undefined =>
  ratingOf(part, 'vmax', 'voltage rating') ?? packageRating(part, packageVolts, 'voltage rating') ?? axialRating(part);
