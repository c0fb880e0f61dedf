import type { Sheet } from '../records';
import { partAt, sheetOf, wireOf } from './sheet-builder';

/** A small driver stage: V1 feeds L1 and Q1, G1 drives the gate through R3, R1 holds it down, D2 across the coil. */
export function gateStage(): Sheet {
  return sheetOf({
    title: 'Gate stage',
    parts: [
      partAt('dc-source', 'V1', 0, 200, { facts: { value: 15, role: 'supply' } }),
      partAt('air-core-coil', 'L1', 300, 100, { turn: 90, facts: { value: 180e-6 } }),
      partAt('diode', 'D2', 240, 100, { turn: 270, facts: { vr_max: 600 } }),
      partAt('nmos', 'Q1', 280, 240, { facts: { vds_max: 450, vgs_max: 20 } }),
      partAt('signal-generator', 'G1', 100, 290, { facts: { high: 11, low: 0 } }),
      partAt('resistor', 'R3', 180, 260, { facts: { value: 10 } }),
      partAt('resistor', 'R1', 230, 310, { turn: 90, facts: { value: 22_000, pmax: 0.25 }, origins: { pmax: 'assumed' } }),
      partAt('zero-volt', 'Z1', 0, 360),
      partAt('zero-volt', 'Z2', 300, 360),
      partAt('zero-volt', 'Z3', 230, 340),
      partAt('zero-volt', 'Z4', 100, 320),
      partAt('net-name', 'N1', 230, 260, { facts: { name: 'GATE' } }),
    ],
    junctions: [{ id: 'top', x: 300, y: 40 }, { id: 'low', x: 300, y: 160 }, { id: 'gate', x: 230, y: 260 }],
    wires: [
      wireOf('V1:+', 'top', [[0, 40]]), wireOf('V1:-', 'Z1:1'),
      wireOf('top', 'L1:1'), wireOf('top', 'D2:K'),
      wireOf('L1:2', 'low'), wireOf('D2:A', 'low'), wireOf('low', 'Q1:D'),
      wireOf('Q1:S', 'Z2:1'), wireOf('G1:+', 'R3:1'), wireOf('R3:2', 'gate'), wireOf('gate', 'Q1:G'), wireOf('gate', 'R1:1'),
    ],
    scenarios: [{ id: 's1', name: 'Bench', ambient: 25, values: { V1: { volts: 15, amps: 0.2 } } }],
    holdPoints: [
      { id: 'h1', name: '15 V', volts: 15, amps: 0.2, source: 'V1', scenario: 's1' },
      { id: 'h2', name: '36 V', volts: 36, amps: 0.5, source: 'V1' },
    ],
  });
}
