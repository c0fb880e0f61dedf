import { voltageSourceDeck } from '../source-line';

export const dcSourceDeck = voltageSourceDeck(
  ['+', '-'], () => undefined, (element) => element.letter === 'V' && element.wave === undefined,
);
