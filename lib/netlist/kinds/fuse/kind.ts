import type { Kind } from '../kind';
import { fuseDeck } from './deck';
import { fuseEngine } from './engine';
import { fuseSymbol } from './symbol';

export const fuseKind: Kind = {
  id: 'fuse',
  title: 'Fuse',
  family: 'Supply',
  letter: 'F',
  pins: [{ name: '1', x: -30, y: 0 }, { name: '2', x: 30, y: 0 }],
  fields: [
    { fact: 'value', label: 'Rated current', unit: 'A', rating: true, min: 0.001, max: 10_000 },
    { fact: 'vmax', rating: true }, { fact: 'rs', label: 'Cold resistance' }, { fact: 'part' }, { fact: 'package' },
  ],
  defaults: {},
  symbol: fuseSymbol,
  deck: fuseDeck,
  engine: fuseEngine,
  printed: ['value', 'vmax'],
};
