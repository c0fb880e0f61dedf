import type { Kind } from '../kind';
import { removableLeadDeck } from './deck';
import { removableLeadEngine } from './engine';
import { removableLeadSymbol } from './symbol';

export const removableLeadKind: Kind = {
  id: 'removable-lead',
  title: 'Removable lead',
  family: 'Leads and points',
  letter: 'W',
  pins: [{ name: '1', x: -30, y: 0 }, { name: '2', x: 30, y: 0 }],
  fields: [{ fact: 'role' }, { fact: 'rs', label: 'Lead resistance' }, { fact: 'part' }],
  defaults: {},
  symbol: removableLeadSymbol,
  deck: removableLeadDeck,
  engine: removableLeadEngine,
  printed: [],
};
