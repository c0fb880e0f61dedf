import { contactDeck } from '../element-line';

export const removableLeadDeck = contactDeck(() => true);
