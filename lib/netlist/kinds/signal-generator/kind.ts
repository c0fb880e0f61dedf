import type { Kind } from '../kind';
import { signalGeneratorDeck } from './deck';
import { signalGeneratorEngine } from './engine';
import { signalGeneratorSymbol } from './symbol';

export const signalGeneratorKind: Kind = {
  id: 'signal-generator',
  title: 'Signal generator',
  family: 'Drive',
  letter: 'G',
  pins: [{ name: '+', x: 0, y: -30 }, { name: '-', x: 0, y: 30 }],
  fields: [
    { fact: 'high', required: true }, { fact: 'low', required: true }, { fact: 'fsw' }, { fact: 'duty' }, { fact: 'rs' },
    { fact: 'value', label: 'Level as drawn', unit: 'V', min: -100_000, max: 100_000 }, { fact: 'ilim' }, { fact: 'role' }, { fact: 'part' },
  ],
  defaults: { role: 'generator', low: 0, rs: 50 },
  symbol: signalGeneratorSymbol,
  deck: signalGeneratorDeck,
  engine: signalGeneratorEngine,
  printed: ['high', 'fsw'],
};
