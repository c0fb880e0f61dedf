import type { Kind } from '../kind';
import { polarisedCapacitorDeck } from './deck';
import { polarisedCapacitorEngine } from './engine';
import { polarisedCapacitorSymbol } from './symbol';

export const polarisedCapacitorKind: Kind = {
  id: 'polarised-capacitor',
  title: 'Capacitor, polarised',
  family: 'R and C',
  letter: 'C',
  pins: [{ name: '+', x: -30, y: 0 }, { name: '-', x: 30, y: 0 }],
  fields: [
    { fact: 'value', label: 'Capacitance', unit: 'F', series: 'E6', required: true, min: 0, max: 10_000 },
    { fact: 'vmax', rating: true }, { fact: 'esr' }, { fact: 'tolerance' }, { fact: 'part' }, { fact: 'package' },
  ],
  defaults: {},
  symbol: polarisedCapacitorSymbol,
  deck: polarisedCapacitorDeck,
  engine: polarisedCapacitorEngine,
  printed: ['value', 'vmax'],
};
