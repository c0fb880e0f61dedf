import { bipolarModel } from '../../models/bipolar-model';
import { cardedDeck } from '../exchange-card';

export const pnpDeck = cardedDeck({
  letter: 'Q',
  pins: ['C', 'B', 'E'],
  suffix: 'BJT',
  modelOf: (part) => bipolarModel(part.facts, 'pnp', 'typ'),
  stand: { type: 'pnp', params: { bf: 100 }, flags: [] },
  read: (element, modelType) => element.letter === 'Q' && modelType === 'pnp',
});
