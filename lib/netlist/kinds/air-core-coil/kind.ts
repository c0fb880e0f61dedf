import type { Kind } from '../kind';
import { airCoreCoilDeck } from './deck';
import { airCoreCoilEngine } from './engine';
import { airCoreCoilSymbol } from './symbol';

export const airCoreCoilKind: Kind = {
  id: 'air-core-coil',
  title: 'Work coil, air core',
  family: 'Load',
  letter: 'L',
  pins: [{ name: '1', x: -30, y: 0 }, { name: '2', x: 30, y: 0 }],
  fields: [
    { fact: 'value', label: 'Inductance', unit: 'H', series: 'E12', required: true, min: 0, max: 1_000 },
    { fact: 'dcr' }, { fact: 'imax' }, { fact: 'load' }, { fact: 'part' }, { fact: 'package' },
  ],
  defaults: { load: 'coil' },
  symbol: airCoreCoilSymbol,
  deck: airCoreCoilDeck,
  engine: airCoreCoilEngine,
  printed: ['value', 'dcr'],
};
