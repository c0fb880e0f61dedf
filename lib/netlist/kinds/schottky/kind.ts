import type { Kind } from '../kind';
import { schottkyDeck } from './deck';
import { schottkyEngine } from './engine';
import { schottkySymbol } from './symbol';

export const schottkyKind: Kind = {
  id: 'schottky',
  title: 'Diode, Schottky',
  family: 'Clamp and indicate',
  letter: 'D',
  pins: [{ name: 'A', x: -30, y: 0 }, { name: 'K', x: 30, y: 0 }],
  fields: [
    { fact: 'part' }, { fact: 'package' },
    { fact: 'vr_max', rating: true }, { fact: 'if_max', rating: true }, { fact: 'vf' }, { fact: 'i_test', label: 'at' },
    { fact: 'trr' }, { fact: 'ifsm' }, { fact: 'rth_ja' }, { fact: 'tj_max' },
  ],
  defaults: {},
  symbol: schottkySymbol,
  deck: schottkyDeck,
  engine: schottkyEngine,
  printed: ['part', 'vr_max'],
};
