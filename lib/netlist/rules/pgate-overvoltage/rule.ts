import type { Rule } from '../rule';
import { gateOutcomes, gateParameters } from '../support/gate-voltage';

export const pgateOvervoltage: Rule<typeof gateParameters> = {
  id: 'pgate-overvoltage', version: 1, title: 'Gate voltage of a P-channel MOSFET above its rating', severity: 'stop', needs: 'points', parameters: gateParameters,
  check: (input) => input.circuit.stages.filter((stage) => stage.transistor.kind === 'pmos').flatMap((stage) => gateOutcomes(input, stage)),
};
