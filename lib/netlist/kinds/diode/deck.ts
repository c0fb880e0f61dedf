import { diodeDeck } from '../exchange-diode';

/** Silicon rectifier where the sheet is silent: 0.7 V at 10 mA. */
export const diodeKindDeck = diodeDeck('DIODE', () => ({ volts: 0.7, amps: 0.01, n: 1.8, rs: 0.05 }), true);
