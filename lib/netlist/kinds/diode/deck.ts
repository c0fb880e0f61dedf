import { diodeModel } from '../../models/diode-model';
import { cardedDeck } from '../exchange-card';

export const diodeKindDeck = cardedDeck({
  letter: 'D',
  pins: ['A', 'K'],
  suffix: 'DIODE',
  modelOf: (part) => diodeModel(part.facts, 'diode'),
  stand: { type: 'd', params: {}, flags: [] },
  read: (element) => element.letter === 'D',
});
