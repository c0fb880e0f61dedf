import type { Drawing } from './draw';

/** A solenoid without a way for its current at turn-off, and a gate that nothing holds: blocked from the first hold point. */
export const spotWelderTrigger: Drawing = {
  title: 'Spot-welder trigger board',
  parts: [
    { key: 'V1', kind: 'dc-supply', at: [60, 280], facts: { value: 12, ilim: 1, role: 'supply' } },
    { key: 'C1', kind: 'polarised-capacitor', at: [180, 280], turn: 90, facts: { value: 470e-6, vmax: 35 } },
    { key: 'L1', kind: 'inductor', at: [540, 180], turn: 90, facts: { value: 12e-3, dcr: 6, load: 'solenoid' } },
    {
      key: 'Q1', kind: 'nmos', at: [520, 340],
      facts: {
        package: 'TO-220', vds_max: 55, vgs_max: 20, id_max: 49, vth_min: 2, vth_max: 4, rds_on: 0.0175, rds_on_spec_vgs: 10,
        qg: 63e-9, igss: 100e-9, ciss: 1_470e-12, crss: 88e-12, rth_ja: 62, tj_max: 175,
      },
    },
    { key: 'R1', kind: 'resistor', at: [420, 360], facts: { value: 47, pmax: 0.25, package: 'axial' } },
    { key: 'W1', kind: 'removable-lead', at: [320, 360] },
    { key: 'G1', kind: 'signal-generator', at: [260, 440], facts: { high: 10, low: 0, rs: 50, role: 'generator' } },
    { key: '0 V', kind: 'zero-volt', at: [60, 580] },
  ],
  junctions: { 'link c': [180, 100], 'zero v': [60, 560], 'zero c': [180, 560], 'zero g': [260, 560] },
  wires: [
    ['V1:+', [60, 100], 'link c'], ['link c', [540, 100], 'L1:1'], ['link c', 'C1:+'], ['C1:-', 'zero c'], ['L1:2', 'Q1:D'],
    ['G1:+', [260, 360], 'W1:1'], ['W1:2', 'R1:1'], ['R1:2', 'Q1:G'],
    ['V1:-', 'zero v'], ['zero v', '0 V:1'], ['zero v', 'zero c'], ['zero c', 'zero g'], ['G1:-', 'zero g'], ['zero g', [540, 560], 'Q1:S'],
  ],
  plan: [{ name: '12 V', volts: 12, amps: 1 }, { name: '24 V', volts: 24, amps: 5 }],
  source: 'V1',
};
