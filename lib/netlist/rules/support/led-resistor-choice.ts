import type { LedBranch } from '../../circuit/led-branches';
import { quantityOf } from '../../circuit/part-facts';
import type { Remedy } from '../../findings/finding';
import { nearestUp } from '../../series/preferred-values';
import { say } from './words';

/** Powers that resistors are made for, watts. */
const standardWatts = [0.125, 0.25, 0.5, 1, 2, 3, 5, 10, 25, 50];
const comfortable = 0.55;
const indicatorAmps = 10e-3;
/** Above this I_F maximum an LED lights something: it is run at 0.7 of it, not dimmed to an indicator. Common practice, no source. */
const lightingFrom = 50e-3;

const wantedAmps = (ifMax: number): number => (ifMax > lightingFrom ? 0.7 * ifMax : Math.min(indicatorAmps, 0.4 * ifMax));

/** Smallest standard power that leaves a resistor below 55 % of it; undefined above 50 W. */
export const wattsFor = (watts: number): number | undefined => standardWatts.find((standard) => watts <= standard * comfortable);

export interface ResistorChoice {
  readonly ohms: number;
  readonly pmax: number;
  readonly amps: number;
}

/** E12 resistor for so many volts across it at most: 10 mA or 0.4 of an indicator's maximum, 0.7 of a lighting LED's. */
export function chooseLedResistor(volts: number, ifMax: number): ResistorChoice | undefined {
  const ohms = nearestUp(volts / wantedAmps(ifMax), 'E12');
  const pmax = wattsFor((volts * volts) / ohms);
  return pmax === undefined ? undefined : { ohms, pmax, amps: volts / ohms };
}

/** Proposed change of the one resistor of a branch; words where there are several, or where no ordinary part fits. */
export function resizeRemedy(branch: LedBranch, voltsAcross: number, ifMax: number): Remedy {
  const choice = chooseLedResistor(voltsAcross, ifMax);
  const resistor = branch.resistors[0];
  if (!choice) return { words: 'Feed the indicator from a lower voltage: no ordinary resistor carries the rest.' };
  const pmax = Math.max(choice.pmax, branch.resistors.length === 1 && resistor ? quantityOf(resistor, 'pmax') ?? 0 : 0);
  const words = `Use ${say(choice.ohms, 'Ω')}, ${say(pmax, 'W')} (${say(choice.amps, 'A')})`;
  if (!resistor || branch.resistors.length !== 1) return { words: `${words} in all.` };
  const vmax = quantityOf(resistor, 'vmax');
  if (vmax !== undefined && vmax < voltsAcross) return { words: `${words}, in a type that stands ${say(voltsAcross, 'V')}.` };
  return { words: `${words} for ${resistor.ref}.`, edits: [{ edit: 'set facts', part: resistor.ref, facts: { value: choice.ohms, pmax } }] };
}
