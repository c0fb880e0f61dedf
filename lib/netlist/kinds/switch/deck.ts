import { contactDeck } from '../element-line';

/** As drawn: open unless the sheet draws it closed. */
export const switchDeck = contactDeck((part) => part.facts.closed_switch === true);
