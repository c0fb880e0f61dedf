import type { Kind } from '../kind';
import { capacitorDeck } from './deck';
import { capacitorEngine } from './engine';
import { capacitorSymbol } from './symbol';

export const capacitorKind: Kind = {
  id: 'capacitor',
  title: 'Capacitor',
  family: 'R and C',
  letter: 'C',
  pins: [{ name: '1', x: -30, y: 0 }, { name: '2', x: 30, y: 0 }],
  fields: [
    { fact: 'value', label: 'Capacitance', unit: 'F', series: 'E12', required: true, min: 0, max: 10_000 },
    { fact: 'vmax', rating: true }, { fact: 'vmax_ac' }, { fact: 'esr' }, { fact: 'tolerance' }, { fact: 'part' }, { fact: 'package' },
  ],
  defaults: {},
  symbol: capacitorSymbol,
  deck: capacitorDeck,
  engine: capacitorEngine,
  printed: ['value', 'vmax'],
};
