import { valueDeck } from '../element-line';

export const resistorDeck = valueDeck('R', ['1', '2'], 1_000);
