import type { Drawing } from './draw';

/** A small stage without anything against it: signed off to the end of its plan. */
export const fanDriver: Drawing = {
  title: 'Fume-extractor fan driver',
  parts: [
    { key: 'V1', kind: 'dc-supply', at: [60, 280], facts: { value: 12, ilim: 0.5, role: 'supply' } },
    { key: 'F1', kind: 'fuse', at: [150, 100], facts: { value: 3, vmax: 60 } },
    { key: 'D1', kind: 'schottky', at: [440, 180], turn: 270, facts: { vr_max: 60, if_max: 5, vf: 0.55, i_test: 5 } },
    { key: 'L1', kind: 'inductor', at: [540, 180], turn: 90, facts: { value: 4e-3, dcr: 18, load: 'motor' } },
    {
      key: 'Q1', kind: 'nmos', at: [520, 340],
      facts: {
        package: 'TO-220', vds_max: 60, vgs_max: 20, id_max: 17, vth_min: 2, vth_max: 4, rds_on: 0.1, rds_on_spec_vgs: 10,
        qg: 25e-9, qgd: 11e-9, igss: 100e-9, ciss: 640e-12, coss: 360e-12, crss: 79e-12, rth_ja: 62, tj_max: 175,
      },
    },
    { key: 'R1', kind: 'resistor', at: [360, 360], facts: { value: 100, pmax: 0.25, package: 'axial' } },
    { key: 'R2', kind: 'resistor', at: [280, 440], turn: 90, facts: { value: 22e3, pmax: 0.25, package: 'axial' } },
    { key: 'G1', kind: 'signal-generator', at: [180, 440], facts: { high: 10, low: 0, fsw: 500, duty: 60, rs: 50, role: 'generator' } },
    { key: 'gate', kind: 'net-name', at: [430, 330], facts: { name: 'GATE' } },
    { key: '0 V', kind: 'zero-volt', at: [60, 580] },
  ],
  junctions: {
    'link d': [440, 100], sw: [540, 250], drive: [280, 360], 'gate name': [430, 360],
    'zero v': [60, 560], 'zero g': [180, 560], 'zero r': [280, 560],
  },
  wires: [
    ['V1:+', [60, 100], 'F1:1'], ['F1:2', 'link d'], ['link d', [540, 100], 'L1:1'], ['link d', 'D1:K'], ['D1:A', [440, 250], 'sw'], ['L1:2', 'sw'], ['sw', 'Q1:D'],
    ['G1:+', [180, 360], 'drive'], ['drive', 'R1:1'], ['drive', 'R2:1'], ['R1:2', 'gate name'], ['gate name', 'Q1:G'], ['gate name', 'gate:1'],
    ['V1:-', 'zero v'], ['zero v', '0 V:1'], ['zero v', 'zero g'], ['G1:-', 'zero g'], ['zero g', 'zero r'], ['R2:2', 'zero r'], ['zero r', [540, 560], 'Q1:S'],
  ],
  plan: [{ name: '12 V', volts: 12, amps: 0.5 }, { name: '24 V', volts: 24, amps: 2 }],
  source: 'V1',
};
