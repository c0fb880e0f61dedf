import type { Kind } from '../kind';
import { zeroVoltDeck } from './deck';
import { zeroVoltEngine } from './engine';
import { zeroVoltSymbol } from './symbol';

export const zeroVoltKind: Kind = {
  id: 'zero-volt',
  title: 'Common return, 0 V',
  family: 'Leads and points',
  letter: null,
  pins: [{ name: '1', x: 0, y: 0 }],
  fields: [],
  defaults: {},
  symbol: zeroVoltSymbol,
  deck: zeroVoltDeck,
  engine: zeroVoltEngine,
  printed: [],
};
