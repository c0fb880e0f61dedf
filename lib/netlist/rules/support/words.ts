import { isAlternating } from '../../circuit/source-role';
import { formatQuantity } from '../../quantity/format-quantity';
import type { RunPoint } from '../../points/point-set';
import type { Station } from '../../points/station';

/** A number as messages print it: three significant digits, engineering notation. */
export const say = (value: number, unit: string): string => formatQuantity(value, unit, 3);

/** `at 36 V`, `at 230 V rms`, or `as drawn` where no power source can be told. */
export function stationWords({ volts, power }: Station): string {
  if (volts === null) return 'as drawn';
  return `at ${say(volts, 'V')}${power && isAlternating(power) ? ' rms' : ''}`;
}

const levelWords = { nominal: '', '+10 %': ' +10 %', 'peak +': ' (positive peak)', 'peak -': ' (negative peak)' } as const;

/** State of the drive, in words: `G1 high`, `J1 lifted`, '' as drawn. */
export function stateWords({ key }: RunPoint): string {
  if (key.state === 'as drawn') return '';
  if (key.state.startsWith('lifted ')) return `${key.state.slice(7)} lifted`;
  if (key.state.startsWith('off ')) return `${key.state.slice(4)} off`;
  return `${key.control ?? 'drive'} ${key.state}`;
}

/** Where a number was read, for evidence: `operating point at 36 V +10 %, drive high`. */
export function pointWords(point: RunPoint): string {
  const state = stateWords(point);
  const limit = point.key.limitLifted ? ', supply limit left out' : '';
  return `operating point ${stationWords(point.station)}${levelWords[point.key.level]}${state === '' ? '' : `, ${state}`}${limit}`;
}

/** The place a message names: `at 36 V`, `at 36 V +10 %, drive high`. */
export function placeWords(point: RunPoint): string {
  const state = stateWords(point);
  const where = `${stationWords(point.station)}${levelWords[point.key.level]}`;
  const limit = point.key.limitLifted ? ' (supply limit left out: it protects nothing here)' : '';
  return `${where}${state === '' ? '' : `, ${state}`}${limit}`;
}

/** `R1`, `R1 and D1`, `R1, R2 and D1`. */
export function listWords(words: readonly string[]): string {
  if (words.length < 2) return words[0] ?? '';
  return `${words.slice(0, -1).join(', ')} and ${words[words.length - 1]}`;
}

/** A title or label inside a sentence: its first letter small, unless it begins a name of capitals (`LED`, `MOSFET`, `V_GS`). */
export const inSentence = (label: string): string => (/^[A-Z][a-z]/.test(label) ? `${label[0]!.toLowerCase()}${label.slice(1)}` : label);
