import { describe, expect, it } from 'vitest';
import type { Sheet } from '../records';
import { gateStage } from '../testing/gate-stage';
import { partAt, wireOf } from '../testing/sheet-builder';
import { contentHashOf, isElectrical, presentationHash, sheetToNetlist } from './sheet-to-netlist';

const change = (id: string, more: Partial<Sheet['parts'][number]>): Sheet => {
  const stage = gateStage();
  return { ...stage, parts: stage.parts.map((part) => (part.id === id ? { ...part, ...more } : part)) };
};

describe('the netlist of a sheet', () => {
  it('has the nets that the drawing joins, named by its marks', () => {
    const { nets, parts } = sheetToNetlist(gateStage());
    expect(nets.map(({ name, pins }) => `${name}: ${pins.join(' ')}`)).toEqual([
      '0: G1:- Q1:S R1:2 V1:-', 'GATE: Q1:G R1:1 R3:2', 'N1: D2:A L1:2 Q1:D', 'N2: D2:K L1:1 V1:+', 'N3: G1:+ R3:1',
    ]);
    expect(parts.map((part) => part.ref)).toEqual(['D2', 'G1', 'L1', 'Q1', 'R1', 'R3', 'V1']);
  });

  it('names sources of plan and scenarios by designator', () => {
    const { holdPoints, scenarios } = sheetToNetlist(change('V1', { ref: 'V7' }));
    expect(holdPoints[0]).toEqual({ name: '15 V', volts: 15, amps: 0.2, source: 'V7', scenario: 'Bench' });
    expect(scenarios[0]?.values).toEqual({ V7: { volts: 15, amps: 0.2 } });
  });

  it('joins a pin placed exactly on another pin', () => {
    const stage = gateStage();
    const touching = { ...stage, parts: [...stage.parts, partAt('test-point', 'TP1', 150, 260)] };
    expect(sheetToNetlist(touching).nets.find((net) => net.pins.includes('TP1:1'))?.pins).toContain('R3:1');
  });
});

describe('an electrical change', () => {
  it('is a new value, designator, wire or hold point', () => {
    const stage = gateStage();
    expect(isElectrical(stage, change('R1', { facts: { value: 33_000 } }))).toBe(true);
    expect(isElectrical(stage, change('R1', { ref: 'R9' }))).toBe(true);
    expect(isElectrical(stage, { ...stage, wires: [...stage.wires, wireOf('G1:+', 'gate')] })).toBe(true);
    expect(isElectrical(stage, { ...stage, holdPoints: [] })).toBe(true);
  });

  it('is not a move of a part, a bend, a note or another name of a net; what is drawn does change', () => {
    const stage = gateStage();
    const moved = change('R3', { x: 170, y: 250 });
    const noted = { ...stage, parts: [...stage.parts, partAt('note', 'X', 600, 0, { facts: { text: 'Keep dry' } })] };
    for (const other of [moved, noted, change('N1', { facts: { name: 'G' } })]) {
      expect(contentHashOf(other)).toBe(contentHashOf(stage));
      expect(presentationHash(other)).not.toBe(presentationHash(stage));
    }
    expect(presentationHash({ ...stage, parts: [...stage.parts].reverse() })).toBe(presentationHash(stage));
  });
});
