import type { Rule } from '../rule';
import { gateOutcomes, gateParameters } from '../support/gate-voltage';

export const ngateOvervoltage: Rule<typeof gateParameters> = {
  id: 'ngate-overvoltage', version: 1, title: 'Gate voltage of an N-channel MOSFET above its rating', severity: 'stop', needs: 'points', parameters: gateParameters,
  check: (input) => input.circuit.stages.filter((stage) => stage.transistor.kind === 'nmos').flatMap((stage) => gateOutcomes(input, stage)),
};
