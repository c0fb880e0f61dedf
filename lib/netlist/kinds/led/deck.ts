import { ledModel } from '../../models/led-model';
import { cardedDeck } from '../exchange-card';

export const ledDeck = cardedDeck({
  letter: 'D',
  pins: ['A', 'K'],
  suffix: 'LED',
  modelOf: (part) => ledModel(part.facts),
  stand: { type: 'd', params: {}, flags: [] },
});
