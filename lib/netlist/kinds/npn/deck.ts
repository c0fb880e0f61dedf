import { bipolarModel } from '../../models/bipolar-model';
import { cardedDeck } from '../exchange-card';

export const npnDeck = cardedDeck({
  letter: 'Q',
  pins: ['C', 'B', 'E'],
  suffix: 'BJT',
  modelOf: (part) => bipolarModel(part.facts, 'npn', 'typ'),
  stand: { type: 'npn', params: { bf: 100 }, flags: [] },
  read: (element, modelType) => element.letter === 'Q' && modelType === 'npn',
});
