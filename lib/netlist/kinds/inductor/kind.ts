import type { Kind } from '../kind';
import { inductorDeck } from './deck';
import { inductorEngine } from './engine';
import { inductorSymbol } from './symbol';

export const inductorKind: Kind = {
  id: 'inductor',
  title: 'Inductor',
  family: 'Load',
  letter: 'L',
  pins: [{ name: '1', x: -30, y: 0 }, { name: '2', x: 30, y: 0 }],
  fields: [
    { fact: 'value', label: 'Inductance', unit: 'H', series: 'E12', required: true, min: 0, max: 1_000 },
    { fact: 'dcr' }, { fact: 'imax' }, { fact: 'load' }, { fact: 'part' }, { fact: 'package' }, { fact: 'coil_v' }, { fact: 'coil_i' },
  ],
  defaults: {},
  symbol: inductorSymbol,
  deck: inductorDeck,
  engine: inductorEngine,
  printed: ['value', 'imax'],
};
