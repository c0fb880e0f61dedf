import type { Kind } from '../kind';
import { dcSourceDeck } from './deck';
import { dcSourceEngine } from './engine';
import { dcSourceSymbol } from './symbol';

export const dcSourceKind: Kind = {
  id: 'dc-source',
  title: 'DC source',
  family: 'Supply',
  letter: 'V',
  pins: [{ name: '+', x: 0, y: -30 }, { name: '-', x: 0, y: 30 }],
  fields: [
    { fact: 'value', label: 'Voltage', unit: 'V', required: true, min: -100_000, max: 100_000 },
    { fact: 'role' }, { fact: 'rs' }, { fact: 'high' }, { fact: 'low' }, { fact: 'fuse' }, { fact: 'isolated' }, { fact: 'part' },
  ],
  defaults: {},
  symbol: dcSourceSymbol,
  deck: dcSourceDeck,
  engine: dcSourceEngine,
  printed: ['value'],
};
