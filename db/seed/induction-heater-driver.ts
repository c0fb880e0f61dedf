import type { Drawing } from './draw';

/**
 * The demo circuit. Its gate has no way to 0 V once J1 is pulled, since R2 sits on the generator's side; its indicator suits the
 * first hold point only. With 22 kΩ from GATE to 0 V the first hold point can be signed.
 */
export const inductionHeaterDriver: Drawing = {
  title: 'Induction-heater driver, low-voltage proof stage',
  parts: [
    { key: 'V1', kind: 'dc-supply', at: [80, 330], facts: { value: 15, ilim: 0.2, role: 'supply', isolated: true } },
    { key: 'F1', kind: 'fuse', at: [160, 100], facts: { value: 2.5, vmax: 500 } },
    { key: 'TP1', kind: 'test-point', at: [220, 100] },
    { key: 'C1', kind: 'capacitor', at: [260, 330], turn: 90, facts: { value: 10e-6, vmax: 630 } },
    { key: 'R4', kind: 'resistor', at: [360, 330], turn: 90, facts: { value: 220e3, pmax: 2, vmax: 500 } },
    { key: 'dc link', kind: 'net-name', at: [560, 70], facts: { name: 'DC LINK' } },
    { key: 'D2', kind: 'diode', at: [740, 180], turn: 270, facts: { vr_max: 600, if_max: 15, vf: 1.4, i_test: 15, trr: 60e-9 } },
    { key: 'L1', kind: 'air-core-coil', at: [840, 180], turn: 90, facts: { value: 180e-6, dcr: 3.6, load: 'coil' } },
    { key: 'R1', kind: 'resistor', at: [960, 180], turn: 90, facts: { value: 1_200, pmax: 0.25, package: 'axial', vmax: 250 } },
    { key: 'D1', kind: 'led', at: [960, 290], turn: 90, facts: { colour: 'red', vf: 2, i_test: 0.02, if_max: 0.025, vr_max: 5 } },
    { key: 'TP3', kind: 'test-point', at: [900, 250] },
    { key: 'sw', kind: 'net-name', at: [790, 230], facts: { name: 'SW' } },
    {
      key: 'Q1', kind: 'nmos', at: [820, 340],
      facts: {
        package: 'TO-220', vds_max: 500, vgs_max: 20, id_max: 8, vth_min: 2, vth_max: 4, rds_on: 0.85, rds_on_spec_vgs: 10,
        qg: 63e-9, qgd: 32e-9, v_plateau: 5, gfs: 4.9, igss: 100e-9, ciss: 1_300e-12, coss: 310e-12, crss: 120e-12, e_as: 0.51, rth_ja: 62, rth_jc: 1, tj_max: 150,
      },
    },
    { key: 'TP2', kind: 'test-point', at: [710, 360] },
    { key: 'gate', kind: 'net-name', at: [740, 330], facts: { name: 'GATE' } },
    { key: 'R3', kind: 'resistor', at: [640, 360], facts: { value: 10, pmax: 0.25, package: 'axial' } },
    { key: 'J1 drive', ref: 'J1', kind: 'plug-contact', at: [560, 360], facts: { contact: '1' } },
    { key: 'J1 return', ref: 'J1', kind: 'plug-contact', at: [560, 540], facts: { contact: '2' } },
    { key: 'drv', kind: 'net-name', at: [450, 330], facts: { name: 'DRV' } },
    { key: 'ret', kind: 'net-name', at: [450, 510], facts: { name: 'RET' } },
    { key: 'G1', kind: 'signal-generator', at: [420, 450], facts: { high: 11, low: 0, fsw: 25e3, duty: 10, rs: 50, role: 'generator' } },
    { key: 'R2', kind: 'resistor', at: [500, 450], turn: 90, facts: { value: 22e3, pmax: 0.25, package: 'axial' } },
    { key: '0 V', kind: 'zero-volt', at: [80, 620] },
  ],
  junctions: {
    'link tp': [220, 100], 'link c': [260, 100], 'link r': [360, 100], 'link name': [560, 100], 'link d': [740, 100], 'link l': [840, 100],
    'sw name': [790, 250], 'sw d': [840, 250], 'gate tp': [710, 360], 'gate name': [740, 360],
    'drv name': [450, 360], 'drv r': [500, 360], 'ret name': [450, 540], 'ret r': [500, 540],
    'zero v': [80, 600], 'zero c': [260, 600], 'zero r': [360, 600], 'zero j': [620, 600], 'zero q': [840, 600],
  },
  wires: [
    ['V1:+', [80, 100], 'F1:1'], ['F1:2', 'link tp'], ['link tp', 'link c'], ['link c', 'link r'], ['link r', 'link name'], ['link name', 'link d'],
    ['link d', 'link l'], ['link l', [960, 100], 'R1:1'], ['link name', 'dc link:1'],
    ['link c', 'C1:1'], ['C1:2', 'zero c'], ['link r', 'R4:1'], ['R4:2', 'zero r'],
    ['link d', 'D2:K'], ['D2:A', [740, 250], 'sw name'], ['sw name', 'sw d'], ['sw name', 'sw:1'], ['link l', 'L1:1'], ['L1:2', 'sw d'],
    ['sw d', 'TP3:1'], ['sw d', 'Q1:D'], ['R1:2', 'D1:A'], ['D1:K', [960, 600], 'zero q'],
    ['G1:+', [420, 360], 'drv name'], ['drv name', 'drv r'], ['drv name', 'drv:1'], ['drv r', 'J1 drive:1'], ['drv r', 'R2:1'],
    ['G1:-', [420, 540], 'ret name'], ['ret name', 'ret r'], ['ret name', 'ret:1'], ['ret r', 'J1 return:1'], ['R2:2', 'ret r'],
    ['J1 return:2', [620, 540], 'zero j'],
    ['J1 drive:2', 'R3:1'], ['R3:2', 'gate tp'], ['gate tp', 'gate name'], ['gate name', 'gate:1'], ['gate name', 'Q1:G'],
    ['Q1:S', 'zero q'],
    ['V1:-', 'zero v'], ['zero v', '0 V:1'], ['zero v', 'zero c'], ['zero c', 'zero r'], ['zero r', 'zero j'], ['zero j', 'zero q'],
  ],
  plan: [
    { name: '15 V', volts: 15, amps: 0.2 }, { name: '36 V', volts: 36, amps: 0.5 }, { name: '85 V', volts: 85, amps: 0.5 },
    { name: '160 V', volts: 160, amps: 1 }, { name: '325 V', volts: 325, amps: 2 },
  ],
  source: 'V1',
};
