import type { Kind } from '../kind';
import { dcSupplyDeck } from './deck';
import { dcSupplyEngine } from './engine';
import { dcSupplySymbol } from './symbol';

export const dcSupplyKind: Kind = {
  id: 'dc-supply',
  title: 'DC supply, current limit',
  family: 'Supply',
  letter: 'V',
  pins: [{ name: '+', x: 0, y: -30 }, { name: '-', x: 0, y: 30 }],
  fields: [
    { fact: 'value', label: 'Voltage', unit: 'V', required: true, min: -100_000, max: 100_000 },
    { fact: 'ilim', required: true }, { fact: 'role' }, { fact: 'fuse' }, { fact: 'isolated' }, { fact: 'earth' }, { fact: 'part' },
  ],
  defaults: { role: 'supply' },
  symbol: dcSupplySymbol,
  deck: dcSupplyDeck,
  engine: dcSupplyEngine,
  printed: ['value', 'ilim'],
};
