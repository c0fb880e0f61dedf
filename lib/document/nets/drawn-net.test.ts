import { describe, expect, it } from 'vitest';
import { gateStage } from '../testing/gate-stage';
import { partAt, sheetOf, wireOf } from '../testing/sheet-builder';
import { drawnNets } from './drawn-net';

const pinsOf = (sheet: Parameters<typeof drawnNets>[0]) =>
  drawnNets(sheet).map((net) => net.pins.map((pin) => `${pin.part}:${pin.pin}`).sort().join(' ')).filter(Boolean).sort();

describe('drawn nets', () => {
  it('follow wires and junctions, and pins that touch', () => {
    expect(pinsOf(gateStage())).toEqual([
      'D2:A L1:2 Q1:D', 'D2:K L1:1 V1:+', 'G1:+ R3:1', 'G1:- Z4:1', 'N1:1 Q1:G R1:1 R3:2', 'Q1:S Z2:1', 'R1:2 Z3:1', 'V1:- Z1:1',
    ]);
  });

  it('do not join wires that merely cross', () => {
    const sheet = sheetOf({
      parts: [partAt('resistor', 'R1', 0, 0), partAt('resistor', 'R2', 200, 0), partAt('resistor', 'R3', 100, -100, { turn: 90 }), partAt('resistor', 'R4', 100, 100, { turn: 90 })],
      wires: [wireOf('R1:2', 'R2:1'), wireOf('R3:2', 'R4:1')],
    });
    expect(pinsOf(sheet)).toEqual(['R1:1', 'R1:2 R2:1', 'R2:2', 'R3:1', 'R3:2 R4:1', 'R4:2']);
  });
});
