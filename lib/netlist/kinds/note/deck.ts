import { markDeck } from '../element-line';

export const noteDeck = markDeck;
