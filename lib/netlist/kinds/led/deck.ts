import { diodeDeck } from '../exchange-diode';

/** Forward point, N and RS by colour where the sheet is silent (`docs/engine.md` 3.2), taken at 20 mA. */
const colours: Readonly<Record<string, readonly [volts: number, n: number, rs: number]>> = {
  infrared: [1.3, 1.6, 3], red: [1.9, 2, 5], amber: [2.05, 2, 6], yellow: [2.05, 2, 6], green: [2.2, 2, 10],
  blue: [3.2, 3, 10], white: [3.2, 3, 10], ultraviolet: [3.5, 3, 10],
};
const red = [1.9, 2, 5] as const;

export const ledDeck = diodeDeck('LED', (part) => {
  const [volts, n, rs] = colours[String(part.facts.colour)] ?? red;
  return { volts, amps: 0.02, n, rs };
});
