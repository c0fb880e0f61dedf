import { describe, expect, test } from 'vitest';
import type { FactValue } from '../netlist';
import { buildNetlist } from './build-netlist';
import { junctionEnd, pinEnd } from './end-key';
import type { DrawnPart, NetlistSource } from './netlist-source';

function part(id: string, kind: DrawnPart['kind'], ref: string, facts: Record<string, FactValue> = {}): DrawnPart {
  return { id, ref, kind, facts, origins: {}, leftOpen: [] };
}

function source(parts: DrawnPart[], joins: NetlistSource['joins'] = []): NetlistSource {
  return { title: 'Sheet', parts, joins, scenarios: [], holdPoints: [], models: [], subcircuits: [] };
}

const name = (id: string, text: string) => part(id, 'net-name', '', { name: text });

describe('nets', () => {
  test('wires and junctions join pins; an unconnected pin is a net of its own', () => {
    const netlist = buildNetlist(source([part('a', 'resistor', 'R1'), part('b', 'resistor', 'R2'), part('c', 'resistor', 'R3')], [
      [pinEnd('a', '2'), junctionEnd('j')], [junctionEnd('j'), pinEnd('b', '1')], [pinEnd('c', '1'), junctionEnd('j')],
    ]));
    expect(netlist.nets.map(({ name: net, pins }) => [net, pins])).toEqual([
      ['N1', ['R1:1']], ['N2', ['R1:2', 'R2:1', 'R3:1']], ['N3', ['R2:2']], ['N4', ['R3:2']],
    ]);
  });

  test('equal net names join without a wire; case counts and outer space does not', () => {
    const netlist = buildNetlist(source(
      [part('a', 'resistor', 'R1'), part('b', 'resistor', 'R2'), name('n1', ' GATE'), name('n2', 'GATE '), name('n3', 'gate')],
      [[pinEnd('a', '1'), pinEnd('n1', '1')], [pinEnd('b', '1'), pinEnd('n2', '1')], [pinEnd('b', '2'), pinEnd('n3', '1')]],
    ));
    expect(netlist.nets.map(({ name: net, pins }) => [net, pins])).toEqual([
      ['GATE', ['R1:1', 'R2:1']], ['gate', ['R2:2']], ['N1', ['R1:2']],
    ]);
  });

  test('every 0 V mark is the one net 0, named or not; the name N1 is not given twice', () => {
    const netlist = buildNetlist(source(
      [part('a', 'resistor', 'R1'), part('b', 'resistor', 'R2'), part('z', 'zero-volt', ''), part('y', 'zero-volt', ''), name('n', 'RETURN'), name('m', 'N1')],
      [[pinEnd('a', '1'), pinEnd('z', '1')], [pinEnd('b', '1'), pinEnd('y', '1')], [pinEnd('b', '1'), pinEnd('n', '1')], [pinEnd('b', '2'), pinEnd('m', '1')]],
    ));
    expect(netlist.nets).toMatchObject([
      { name: '0', givenNames: ['RETURN'], pins: ['R1:1', 'R2:1'] }, { name: 'N1', givenNames: ['N1'] }, { name: 'N2', givenNames: [] },
    ]);
  });

  test('earth marks its net and is not 0 V', () => {
    const netlist = buildNetlist(source([part('a', 'resistor', 'R1'), part('e', 'earth', '')], [[pinEnd('a', '1'), pinEnd('e', '1')]]));
    expect(netlist.nets[0]).toEqual({ name: 'N1', givenNames: [], pins: ['R1:1'], facts: { kind: 'earth' } });
  });

  test('marks and notes are no parts; a test point is one', () => {
    const netlist = buildNetlist(source([part('n', 'note', '', { text: 'hot' }), name('m', 'A'), part('t', 'test-point', 'TP1')]));
    expect(netlist.parts.map(({ ref }) => ref)).toEqual(['TP1']);
  });

  test('contacts of one plug are told apart', () => {
    const netlist = buildNetlist(source([part('a', 'plug-contact', 'J1', { contact: 1 }), part('b', 'plug-contact', 'J1', { contact: 2 })]));
    expect(netlist.nets.map(({ pins }) => pins[0])).toEqual(['J1:1/1', 'J1:1/2', 'J1:2/1', 'J1:2/2']);
  });
});

test('pins left open keep the order of the kind, and foreign pin names go', () => {
  const drawn = { ...part('q', 'nmos', 'Q1'), leftOpen: ['S', 'G', 'X'] };
  expect(buildNetlist(source([drawn])).parts[0]?.leftOpen).toEqual(['G', 'S']);
});

test('the plan is in ascending order', () => {
  const plan = [{ name: 'b', volts: 36, amps: 1 }, { name: 'a', volts: 15, amps: 1 }];
  expect(buildNetlist({ ...source([]), holdPoints: plan }).holdPoints.map(({ volts }) => volts)).toEqual([15, 36]);
});
