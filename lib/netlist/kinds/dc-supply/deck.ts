import { voltageSourceDeck } from '../source-line';

/** The current limit stands in the fact line: an exchanged deck has the ideal source. */
export const dcSupplyDeck = voltageSourceDeck(['+', '-'], () => undefined);
