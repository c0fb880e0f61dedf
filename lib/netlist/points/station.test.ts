import { describe, expect, it } from 'vitest';
import { buildCircuit } from '../circuit/circuit';
import { netlistFromDeck } from '../deck/netlist-from-deck';
import { readDeck } from '../deck/read-deck';
import { stationsOf } from './station';

function powerAt(source: string) {
  const reading = readDeck('t\nV1 a 0 12\n*@V1 role=supply\nR1 a 0 1k\n.end\n');
  if (!reading.ok) throw new Error('The deck of this test cannot be read.');
  const { netlist } = netlistFromDeck(reading.document);
  const [station] = stationsOf(buildCircuit({ ...netlist, holdPoints: [{ name: '15 V', volts: 15, amps: 1, source }] }));
  return station?.power?.ref ?? null;
}

describe('the source that a hold point raises', () => {
  it('is the one that the plan names', () => expect(powerAt('V1')).toBe('V1'));
  it('is not known where the plan names a part that is no source, or none there is', () => {
    expect([powerAt('R1'), powerAt('V9')]).toEqual([null, null]);
  });
});
