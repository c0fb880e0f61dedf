import type { Kind } from '../kind';
import { resistorDeck } from './deck';
import { resistorEngine } from './engine';
import { resistorSymbol, zigzagResistorSymbol } from './symbol';

export const resistorKind: Kind = {
  id: 'resistor',
  title: 'Resistor',
  family: 'R and C',
  letter: 'R',
  pins: [{ name: '1', x: -30, y: 0 }, { name: '2', x: 30, y: 0 }],
  fields: [
    { fact: 'value', label: 'Resistance', unit: 'Ω', series: 'E24', required: true, min: 0, max: 1e12 },
    { fact: 'pmax', rating: true }, { fact: 'package' }, { fact: 'tolerance' }, { fact: 'vmax' }, { fact: 'load' }, { fact: 'part' },
  ],
  defaults: {},
  symbol: resistorSymbol,
  alternatives: [zigzagResistorSymbol],
  deck: resistorDeck,
  engine: resistorEngine,
  printed: ['value', 'pmax'],
};
