import type { Kind } from '../kind';
import { switchDeck } from './deck';
import { switchEngine } from './engine';
import { switchSymbol } from './symbol';

export const switchKind: Kind = {
  id: 'switch',
  title: 'Switch, make contact',
  family: 'Control',
  letter: 'S',
  pins: [{ name: '1', x: -30, y: 0 }, { name: '2', x: 30, y: 0 }],
  fields: [{ fact: 'closed_switch' }, { fact: 'vmax' }, { fact: 'imax' }, { fact: 'rs', label: 'Contact resistance' }, { fact: 'part' }],
  defaults: { closed_switch: false },
  symbol: switchSymbol,
  deck: switchDeck,
  engine: switchEngine,
  printed: ['closed_switch'],
};
