import { expect, it } from 'vitest';
import { searchKinds } from './search-kinds';

const found = (typed: string) => searchKinds(typed).flatMap((group) => group.kinds.map((kind) => kind.id));

it('finds kinds by title, letter and the words people use', () => {
  expect(found('res')).toEqual(['resistor']);
  expect(found('zen')).toEqual(['zener']);
  expect(found('gnd')).toEqual(['zero-volt']);
  expect(found('mosfet n')).toContain('nmos');
  expect(found('n-mos')).toEqual(['nmos']);
  expect(found('N-channel')).toEqual(['nmos']);
  expect(found('mosfet, p')).toEqual(['pmos']);
  expect(found('flux')).toEqual([]);
  expect(found('  ')).toHaveLength(26);
});
