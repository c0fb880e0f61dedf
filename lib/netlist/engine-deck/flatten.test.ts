import { describe, expect, it } from 'vitest';
import type { DeckElement, ModelCard, Subcircuit } from '../netlist';
import { flatten, FlattenFault } from './flatten';

function element(letter: string, name: string, nodes: readonly string[], rest: Partial<DeckElement> = {}): DeckElement {
  return { letter, name, nodes, params: {}, line: 1, ...rest };
}
const card = (name: string, is: number): ModelCard => ({ name, type: 'd', params: { is }, flags: [] });
function subcircuit(name: string, pins: readonly string[], elements: readonly DeckElement[], rest: Partial<Subcircuit> = {}): Subcircuit {
  return { name, pins, elements, models: [], subcircuits: [], ...rest };
}

const inner = subcircuit('IN', ['p', 'q'], [element('R', 'R1', ['p', 'M']), element('D', 'D1', ['m', 'q'], { model: 'DX' }), element('C', 'C1', ['m', 'GND'])]);
const outer = subcircuit('OUT', ['I', 'o'], [element('X', 'X9', ['i', 'y'], { model: 'in' }), element('R', 'R2', ['y', 'o'])], {
  subcircuits: [inner], models: [card('dx', 2e-9)],
});
const scope = { models: [card('DX', 1e-9)], subcircuits: [outer] };

describe('a subcircuit in its place', () => {
  const flat = flatten([element('X', 'X1', ['A', '0'], { model: 'Out' }), element('D', 'D5', ['a', 'gnd'], { model: 'dx' })], scope);

  it('gives inner nodes the path as ngspice writes it, and keeps node 0', () => {
    expect(flat.map(({ path, nodes }) => [path, ...nodes])).toEqual([
      ['x1.x9.r1', 'a', 'x1.x9.m'], ['x1.x9.d1', 'x1.x9.m', 'x1.y'], ['x1.x9.c1', 'x1.x9.m', '0'], ['x1.r2', 'x1.y', '0'], ['d5', 'a', '0'],
    ]);
  });

  it('takes the model of the innermost place that has it', () => {
    expect(flat.map((entry) => entry.card?.params.is)).toEqual([undefined, 2e-9, undefined, undefined, 1e-9]);
  });
});

it.each([
  ['is not there', [element('X', 'X1', ['a', '0'], { model: 'NONE' })], 'not in the deck'],
  ['has another number of pins', [element('X', 'X1', ['a', 'b', '0'], { model: 'OUT' })], 'has 2 pins and is given 3'],
])('says when it %s', (_, elements, words) => {
  expect(() => flatten(elements, scope)).toThrow(words);
});

it('says when one holds itself', () => {
  const loop = subcircuit('LOOP', ['a', 'b'], [element('X', 'X1', ['a', 'b'], { model: 'LOOP' })]);
  expect(() => flatten([element('X', 'X1', ['a', '0'], { model: 'LOOP' })], { models: [], subcircuits: [loop] })).toThrow(FlattenFault);
});
