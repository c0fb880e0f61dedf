import type { Kind } from '../kind';
import { testPointDeck } from './deck';
import { testPointEngine } from './engine';
import { testPointSymbol } from './symbol';

export const testPointKind: Kind = {
  id: 'test-point',
  title: 'Test point',
  family: 'Leads and points',
  letter: 'TP',
  pins: [{ name: '1', x: 0, y: 0 }],
  fields: [],
  defaults: {},
  symbol: testPointSymbol,
  deck: testPointDeck,
  engine: testPointEngine,
  printed: [],
};
