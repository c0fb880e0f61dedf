import type { Kind } from '../kind';
import { diodeKindDeck } from './deck';
import { diodeEngine } from './engine';
import { diodeSymbol } from './symbol';

export const diodeKind: Kind = {
  id: 'diode',
  title: 'Diode',
  family: 'Clamp and indicate',
  letter: 'D',
  pins: [{ name: 'A', x: -30, y: 0 }, { name: 'K', x: 30, y: 0 }],
  fields: [
    { fact: 'part' }, { fact: 'package' },
    { fact: 'vr_max', rating: true }, { fact: 'if_max', rating: true }, { fact: 'vf' }, { fact: 'i_test', label: 'at' },
    { fact: 'trr' }, { fact: 'ifsm' }, { fact: 'rth_ja' }, { fact: 'tj_max' },
  ],
  defaults: {},
  symbol: diodeSymbol,
  deck: diodeKindDeck,
  engine: diodeEngine,
  printed: ['part', 'vr_max'],
};
