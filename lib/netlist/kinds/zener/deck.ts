import { diodeDeck } from '../exchange-diode';

/** Forward branch where the sheet is silent: 0.75 V at 10 mA. */
export const zenerDeck = diodeDeck('ZENER', () => ({ volts: 0.75, amps: 0.01, n: 1.5, rs: 1 }));
