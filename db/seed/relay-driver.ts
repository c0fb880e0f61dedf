import type { Drawing } from './draw';

/** A relay on a bipolar transistor, put up for review with nothing against it. */
export const relayDriver: Drawing = {
  title: 'Kiln interlock relay driver, 12 V',
  parts: [
    { key: 'V1', kind: 'dc-supply', at: [60, 280], facts: { value: 12, ilim: 0.3, role: 'supply' } },
    { key: 'D1', kind: 'diode', at: [400, 180], turn: 270, facts: { part: '1N4007', vr_max: 1_000, if_max: 1, vf: 1.1, i_test: 1, trr: 2e-6 } },
    { key: 'L1', kind: 'inductor', at: [500, 180], turn: 90, facts: { value: 0.3, dcr: 270, load: 'relay', coil_v: 12, coil_i: 0.044 } },
    { key: 'Q1', kind: 'npn', at: [480, 340], facts: { part: '2N2222A', vceo_max: 40, vebo_max: 6, ic_max: 0.6, hfe_min: 75, hfe_typ: 150, vce_sat: 0.3 } },
    { key: 'R1', kind: 'resistor', at: [340, 340], facts: { value: 1_000, pmax: 0.25, package: 'axial' } },
    { key: 'R2', kind: 'resistor', at: [400, 420], turn: 90, facts: { value: 10e3, pmax: 0.25, package: 'axial' } },
    { key: 'G1', kind: 'signal-generator', at: [200, 420], facts: { high: 5, low: 0, rs: 50, role: 'generator' } },
    { key: 'R3', kind: 'resistor', at: [600, 180], turn: 90, facts: { value: 1_000, pmax: 0.25, package: 'axial' } },
    { key: 'D2', kind: 'led', at: [600, 290], turn: 90, facts: { colour: 'green', vf: 2.1, i_test: 0.02, if_max: 0.025, vr_max: 5 } },
    { key: '0 V', kind: 'zero-volt', at: [60, 560] },
  ],
  junctions: {
    'link d': [400, 100], 'link l': [500, 100], coil: [500, 250], base: [400, 340],
    'zero v': [60, 540], 'zero g': [200, 540], 'zero r': [400, 540], 'zero q': [500, 540],
  },
  wires: [
    ['V1:+', [60, 100], 'link d'], ['link d', 'link l'], ['link l', [600, 100], 'R3:1'], ['link d', 'D1:K'], ['link l', 'L1:1'],
    ['D1:A', [400, 250], 'coil'], ['L1:2', 'coil'], ['coil', 'Q1:C'],
    ['R3:2', 'D2:A'], ['D2:K', [600, 540], 'zero q'],
    ['G1:+', [200, 340], 'R1:1'], ['R1:2', 'base'], ['base', 'Q1:B'], ['base', 'R2:1'],
    ['V1:-', 'zero v'], ['zero v', '0 V:1'], ['zero v', 'zero g'], ['G1:-', 'zero g'], ['zero g', 'zero r'], ['R2:2', 'zero r'], ['zero r', 'zero q'], ['Q1:E', 'zero q'],
  ],
  plan: [{ name: '5 V', volts: 5, amps: 0.1 }, { name: '12 V', volts: 12, amps: 0.3 }],
  source: 'V1',
};
