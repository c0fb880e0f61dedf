import type { Kind } from '../kind';
import { ledDeck } from './deck';
import { ledEngine } from './engine';
import { ledSymbol } from './symbol';

export const ledKind: Kind = {
  id: 'led',
  title: 'LED',
  family: 'Clamp and indicate',
  letter: 'D',
  pins: [{ name: 'A', x: -30, y: 0 }, { name: 'K', x: 30, y: 0 }],
  fields: [
    { fact: 'colour' }, { fact: 'vf', rating: true }, { fact: 'i_test', label: 'at' }, { fact: 'if_max', rating: true },
    { fact: 'vr_max' }, { fact: 'part' }, { fact: 'package' },
  ],
  defaults: { colour: 'red' },
  symbol: ledSymbol,
  deck: ledDeck,
  engine: ledEngine,
  printed: ['colour', 'if_max'],
};
