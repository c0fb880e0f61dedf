import type { Kind } from '../kind';
import { boxDeck } from './deck';
import { boxEngine } from './engine';
import { boxSymbol } from './symbol';

/** What a deck brought and no kind claims. Its pins are its own, as many as the deck gave it. */
export const boxKind: Kind = {
  id: 'box',
  title: 'Part, not examined',
  family: 'Leads and points',
  letter: null,
  pins: [],
  fields: [{ fact: 'part' }, { fact: 'package' }],
  defaults: {},
  symbol: boxSymbol,
  deck: boxDeck,
  engine: boxEngine,
  printed: ['part'],
};
