import { zenerModel } from '../../models/zener-model';
import { cardedDeck } from '../exchange-card';

export const zenerDeck = cardedDeck({
  letter: 'D',
  pins: ['A', 'K'],
  suffix: 'ZENER',
  modelOf: (part) => zenerModel(part.facts),
  stand: { type: 'd', params: {}, flags: [] },
});
