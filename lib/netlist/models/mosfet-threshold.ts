import type { Corner } from '../kinds/kind-engine';
import type { FactKey } from '../facts/fact-registry';
import type { Facts } from '../netlist';
import { magnitude } from './fact-number';
import type { Assumption } from './fitted-model';

/** Drain current at which power MOSFETs' thresholds are usually stated, amps (docs/engine.md 3.1). */
const thresholdCurrent = 250e-6;

export interface Threshold {
  readonly volts: number;
  /** I_D at that threshold, amps. */
  readonly amps: number;
  readonly assumed: readonly Assumption[];
}

/**
 * Threshold of a corner. A corner that the sheet does not bound stands at the nearest value it does give, and says so;
 * the rules that turn on the bound itself read the fact.
 */
export function thresholdAt(facts: Facts, corner: Corner): Threshold | { readonly missing: FactKey } {
  const [min, typ, max] = [magnitude(facts, 'vth_min'), magnitude(facts, 'vth_typ'), magnitude(facts, 'vth_max')];
  const middle = typ ?? (min !== undefined && max !== undefined ? (min + max) / 2 : undefined);
  const nearest = middle ?? min ?? max;
  if (nearest === undefined) return { missing: 'vth_typ' };

  const stated = { min, typ, max }[corner];
  if (stated !== undefined) return { volts: stated, amps: thresholdCurrent, assumed: [] };
  const words = corner === 'typ' && min !== undefined && max !== undefined
    ? 'not given: mean of minimum and maximum'
    : `not given: ${nearest} V, the nearest that is`;
  return { volts: nearest, amps: thresholdCurrent, assumed: [{ fact: `vth_${corner}`, words }] };
}
