import { mosfetDeck } from '../exchange-mosfet';

export const nmosDeck = mosfetDeck('nmos');
