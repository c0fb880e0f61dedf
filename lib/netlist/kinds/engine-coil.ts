import { magnitude } from '../models/fact-number';
import type { NetlistPart } from '../netlist';
import { closedOhms } from './element-line';
import { resistorElement } from './engine-resistive';
import type { KindEngine } from './kind-engine';

/** Winding resistance, ohms: as given, or from the rated volts and amps of a relay coil. */
function windingOhms(part: NetlistPart): number | undefined {
  const [volts, amps] = [magnitude(part.facts, 'coil_v'), magnitude(part.facts, 'coil_i')];
  return magnitude(part.facts, 'dcr') ?? magnitude(part.facts, 'rs')
    ?? (volts !== undefined && amps !== undefined ? volts / amps : undefined);
}

/**
 * Engine half of a coil: its winding's resistance at DC. Where nobody gave one, the coil counts as a closed contact
 * (1 mΩ, said as assumed) and as stiff: an ideal source straight across it is refused before a run, because the current
 * of such a short would be the assumption's and nobody's measurement.
 */
export const coilEngine: KindEngine = {
  controlPins: [],
  edges: (part) => [
    { from: '1', to: '2', stiffness: 'solid', ...(windingOhms(part) === undefined ? { stiff: 'coil' as const } : {}) },
  ],
  elements(part, context) {
    const ohms = windingOhms(part);
    const elements = resistorElement(context, ['1', '2'], ohms ?? closedOhms);
    return ohms === undefined ? { ...elements, assumed: [{ fact: 'dcr', words: 'not given: 1 mΩ' }] } : elements;
  },
};
