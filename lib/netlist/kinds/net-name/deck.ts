import { markDeck } from '../element-line';

export const netNameDeck = markDeck;
