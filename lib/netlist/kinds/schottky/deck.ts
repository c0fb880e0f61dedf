import { diodeModel } from '../../models/diode-model';
import { cardedDeck } from '../exchange-card';

export const schottkyDeck = cardedDeck({
  letter: 'D',
  pins: ['A', 'K'],
  suffix: 'SCHOTTKY',
  modelOf: (part) => diodeModel(part.facts, 'schottky'),
  stand: { type: 'd', params: {}, flags: [] },
});
