import { contactDeck } from '../element-line';

/** As drawn: closed unless the sheet draws it open. */
export const switchDeck = contactDeck((part) => part.facts.closed_switch !== false);
