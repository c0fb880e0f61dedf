import { contactDeck } from '../element-line';

/** A whole fuse; its current rating stands in the fact line. */
export const fuseDeck = contactDeck(() => true);
