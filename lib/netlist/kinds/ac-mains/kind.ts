import type { Kind } from '../kind';
import { acMainsDeck } from './deck';
import { acMainsEngine } from './engine';
import { acMainsSymbol } from './symbol';

export const acMainsKind: Kind = {
  id: 'ac-mains',
  title: 'AC mains',
  family: 'Supply',
  letter: 'V',
  pins: [{ name: 'L', x: 0, y: -30 }, { name: 'N', x: 0, y: 30 }],
  fields: [
    { fact: 'rms', required: true }, { fact: 'f', required: true }, { fact: 'role' }, { fact: 'ilim' }, { fact: 'rs' },
    { fact: 'isolated' }, { fact: 'fuse' }, { fact: 'bleeder' }, { fact: 'earth' },
  ],
  defaults: { role: 'mains', rms: 230, f: 50 },
  symbol: acMainsSymbol,
  deck: acMainsDeck,
  engine: acMainsEngine,
  printed: ['rms', 'f'],
};
