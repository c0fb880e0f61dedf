import { bipolarDeck } from '../exchange-bipolar';

export const pnpDeck = bipolarDeck('pnp');
