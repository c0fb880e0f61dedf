import { contactDeck } from '../element-line';

export const plugContactDeck = contactDeck(() => true);
