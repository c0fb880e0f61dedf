import type { Kind } from '../kind';
import { plugContactDeck } from './deck';
import { plugContactEngine } from './engine';
import { plugContactSymbol } from './symbol';

export const plugContactKind: Kind = {
  id: 'plug-contact',
  title: 'Plug and socket contact',
  family: 'Leads and points',
  letter: 'J',
  pins: [{ name: '1', x: -20, y: 0 }, { name: '2', x: 20, y: 0 }],
  fields: [{ fact: 'contact' }, { fact: 'vmax' }, { fact: 'imax' }, { fact: 'part' }],
  defaults: {},
  symbol: plugContactSymbol,
  deck: plugContactDeck,
  engine: plugContactEngine,
  printed: ['contact'],
};
