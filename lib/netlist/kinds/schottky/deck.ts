import { diodeDeck } from '../exchange-diode';

/** Power Schottky where the sheet is silent: 0.45 V at 100 mA. */
export const schottkyDeck = diodeDeck('SCHOTTKY', () => ({ volts: 0.45, amps: 0.1, n: 1.2, rs: 0.05 }));
