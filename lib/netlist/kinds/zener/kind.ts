import type { Kind } from '../kind';
import { zenerDeck } from './deck';
import { zenerEngine } from './engine';
import { zenerSymbol } from './symbol';

export const zenerKind: Kind = {
  id: 'zener',
  title: 'Diode, Zener',
  family: 'Clamp and indicate',
  letter: 'D',
  pins: [{ name: 'A', x: -30, y: 0 }, { name: 'K', x: 30, y: 0 }],
  fields: [
    { fact: 'vz', required: true }, { fact: 'i_test', label: 'at' }, { fact: 'zz' }, { fact: 'pmax', rating: true }, { fact: 'if_max' }, { fact: 'vf' },
    { fact: 'part' }, { fact: 'package' }, { fact: 'rth_ja' }, { fact: 'tj_max' },
  ],
  defaults: {},
  symbol: zenerSymbol,
  deck: zenerDeck,
  engine: zenerEngine,
  printed: ['vz', 'pmax'],
};
