import type { Kind } from '../kind';
import { netNameDeck } from './deck';
import { netNameEngine } from './engine';
import { netNameSymbol } from './symbol';

export const netNameKind: Kind = {
  id: 'net-name',
  title: 'Net name',
  family: 'Leads and points',
  letter: null,
  pins: [{ name: '1', x: 0, y: 0 }],
  fields: [{ fact: 'name', required: true }],
  defaults: {},
  symbol: netNameSymbol,
  deck: netNameDeck,
  engine: netNameEngine,
  printed: ['name'],
};
