import { markDeck } from '../element-line';

export const zeroVoltDeck = markDeck;
