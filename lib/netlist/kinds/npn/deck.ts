import { bipolarDeck } from '../exchange-bipolar';

export const npnDeck = bipolarDeck('npn');
