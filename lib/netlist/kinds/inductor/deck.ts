import { valueDeck } from '../element-line';

export const inductorDeck = valueDeck('L', ['1', '2'], 1e-6);
