import { markDeck } from '../element-line';

export const earthDeck = markDeck;
