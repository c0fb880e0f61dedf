import { mosfetDeck } from '../exchange-mosfet';

export const pmosDeck = mosfetDeck('pmos');
