import { sourceEngine } from '../engine-source';
import { drawnLevel } from '../engine-source-level';

/** As drawn a generator without a level of its own stands low, where its pulse begins. */
export const signalGeneratorEngine = sourceEngine(
  ['+', '-'],
  (part, setting) => {
    const low = part.facts.low;
    return setting.volts ?? drawnLevel(part) ?? (typeof low === 'number' ? low : undefined);
  },
  'low',
);
