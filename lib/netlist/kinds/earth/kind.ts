import type { Kind } from '../kind';
import { earthDeck } from './deck';
import { earthEngine } from './engine';
import { earthSymbol } from './symbol';

export const earthKind: Kind = {
  id: 'earth',
  title: 'Earth',
  family: 'Leads and points',
  letter: null,
  pins: [{ name: '1', x: 0, y: 0 }],
  fields: [],
  defaults: {},
  symbol: earthSymbol,
  deck: earthDeck,
  engine: earthEngine,
  printed: [],
};
