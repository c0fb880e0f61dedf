import { markDeck } from '../element-line';

export const testPointDeck = markDeck;
