import { valueDeck } from '../element-line';

export const capacitorDeck = valueDeck('C', ['1', '2'], 100e-9);
