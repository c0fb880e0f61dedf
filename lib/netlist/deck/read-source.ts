import type { Wave } from '../netlist';
import { deckLimits } from './deck-limits';
import { DeckRefusal } from './deck-refusal';
import type { Numbers } from './statement';
import type { Token } from './tokens';

/** Fewest and most numbers of each wave. */
const waveCounts: Readonly<Record<Wave['shape'], readonly [number, number]>> = {
  sin: [2, 6], pulse: [2, 8], exp: [2, 6], pwl: [2, deckLimits.waveNumbers],
};

export interface SourceWords {
  /** DC volts or amps; undefined when the source gives only a wave. */
  readonly value?: number;
  readonly wave?: Wave;
}

/** Reads what follows the nodes of a V or I element: a bare value, DC, AC, SIN, PULSE, EXP, PWL in any order. */
export function readSource(name: string, words: readonly Token[], numbers: Numbers, line: number): SourceWords {
  let value: number | undefined;
  let wave: Wave | undefined;
  let index = 0;
  const nextNumber = () => {
    const token = words[index];
    const number = token && numbers.tryRead(token, line);
    if (number !== undefined) index += 1;
    return number;
  };
  while (index < words.length) {
    const token = words[index] as Token;
    const word = token.kind === 'word' ? token.text.toLowerCase() : '';
    if (word === 'dc') {
      index += 1;
      value = nextNumber();
      if (value === undefined) throw new DeckRefusal(line, `${name} has no number after DC.`);
    } else if (word === 'ac') {
      index += 1;
      if (nextNumber() !== undefined) nextNumber();
    } else if (Object.hasOwn(waveCounts, word)) {
      if (wave) throw new DeckRefusal(line, `${name} has two waves.`);
      const end = waveEnd(words, index + 1, numbers, line);
      wave = readWave(name, word as Wave['shape'], words.slice(index + 1, end), numbers, line);
      index = end;
    } else {
      if (value !== undefined) throw new DeckRefusal(line, `${name}: ${token.text} is not understood after its value.`);
      value = numbers.read(token, line);
      index += 1;
    }
  }
  return { ...(value === undefined ? {} : { value }), ...(wave ? { wave } : {}) };
}

/** Index after the arguments of a wave: after its closing parenthesis, or after the last number where it has none. */
function waveEnd(words: readonly Token[], start: number, numbers: Numbers, line: number): number {
  if (words[start]?.kind === 'open') return words.findIndex((token, index) => index > start && token.kind === 'close') + 1;
  let end = start;
  while (end < words.length && numbers.tryRead(words[end] as Token, line) !== undefined) end += 1;
  return end;
}

function readWave(name: string, shape: Wave['shape'], tokens: readonly Token[], numbers: Numbers, line: number): Wave {
  const args = tokens.filter((token) => token.kind === 'word' || token.kind === 'brace').map((token) => numbers.read(token, line));
  const [fewest, most] = waveCounts[shape];
  if (args.length < fewest || args.length > most) {
    throw new DeckRefusal(line, `${name}: ${shape.toUpperCase()} takes ${fewest} to ${most} numbers and has ${args.length}.`);
  }
  if (shape === 'pwl') checkTimes(name, args, line);
  return { shape, args };
}

function checkTimes(name: string, args: readonly number[], line: number): void {
  if (args.length % 2 !== 0) throw new DeckRefusal(line, `${name}: PWL takes pairs of time and value.`);
  for (let index = 2; index < args.length; index += 2) {
    if ((args[index] as number) <= (args[index - 2] as number)) throw new DeckRefusal(line, `${name}: the times of PWL must rise.`);
  }
}
