import type { Kind } from '../kind';
import { noteDeck } from './deck';
import { noteEngine } from './engine';
import { noteSymbol } from './symbol';

export const noteKind: Kind = {
  id: 'note',
  title: 'Note on the sheet',
  family: 'Leads and points',
  letter: null,
  pins: [],
  fields: [{ fact: 'text', required: true }],
  defaults: {},
  symbol: noteSymbol,
  deck: noteDeck,
  engine: noteEngine,
  printed: ['text'],
};
