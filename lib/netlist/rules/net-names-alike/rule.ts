import type { Net } from '../../netlist';
import type { Outcome, Rule, RuleInput } from '../rule';
import { everywhere } from '../support/outcome';
import { areAliases, areMistyped } from './likeness';

const parameters = {
  leastCharacters: { value: 4, unit: '', words: 'characters from which names are compared', source: 'common practice, no source' },
  lonePins: { value: 1, unit: '', words: 'pins up to which one of two nets looks mistyped', source: 'common practice, no source' },
} as const;

type Input = RuleInput<typeof parameters>;

interface Pair {
  readonly fewer: Net;
  readonly more: Net;
  readonly names: readonly [fewer: string, more: string];
}

const namesOf = (net: Net): readonly string[] => (net.name === '0' ? ['0', ...net.givenNames] : net.givenNames);

/** Two rails that sources hold apart are two nets, whatever they are called. */
const heldApart = ({ circuit }: Input, a: Net, b: Net): boolean => circuit.rails.has(a.name) && circuit.rails.has(b.name);

function alike(input: Input, [a, b]: readonly [Net, Net]): readonly Pair[] {
  const [fewer, more] = a.pins.length <= b.pins.length && a.name !== '0' ? [a, b] : [b, a];
  const { leastCharacters, lonePins } = input.parameters;
  for (const left of namesOf(fewer)) {
    for (const right of namesOf(more)) {
      const mistyped = fewer.pins.length <= lonePins && areMistyped(left, right, leastCharacters);
      if (mistyped || (areAliases(left, right) && !heldApart(input, a, b))) return [{ fewer, more, names: [left, right] }];
    }
  }
  return [];
}

/** The parts on the net with fewer pins, then one of the other: where the join is missing. */
const refsOf = ({ fewer, more }: Pair): readonly string[] =>
  [...fewer.pins.slice(0, 2), ...more.pins.slice(0, 2)].map((pin) => pin.slice(0, pin.indexOf(':')));

function judge(pair: Pair): Outcome {
  const { fewer, more, names: [left, right] } = pair;
  const shown = right === '0' ? '0 V' : right;
  return everywhere({
    outcome: 'fail', severity: 'caution', confidence: 'likely', target: { net: [fewer.name, more.name].sort() },
    refs: refsOf(pair), nets: [fewer.name, more.name],
    message: `Nets ${left} and ${shown} are not joined, and their names look like one`,
    evidence: [
      { entity: `${left}, ${shown}`, quantity: 'told apart by name', value: false, unit: '', source: 'sheet' },
      { entity: left, quantity: 'pins on the net', value: fewer.pins.length, unit: '', source: 'sheet' },
      { entity: shown, quantity: 'pins on the net', value: more.pins.length, unit: '', source: 'sheet' },
    ],
    remedy: { words: `Give both the name ${shown}, or names that nobody takes for one.`, ...(right === '0' ? {} : { edits: [{ edit: 'rename net', from: left, to: right }] }) },
  });
}

function clear(net: Net): Outcome {
  return everywhere({
    outcome: 'pass', severity: 'caution', confidence: 'likely', target: { net: [net.name] }, refs: [], nets: [net.name],
    message: `No other net has a name like ${net.name === '0' ? '0 V' : net.name}`,
    evidence: [{ entity: net.name, quantity: 'told apart by name', value: true, unit: '', source: 'sheet' }],
  });
}

export const netNamesAlike: Rule<typeof parameters> = {
  id: 'net-names-alike', version: 1, title: 'Net names that look like one', severity: 'caution', needs: 'topology', parameters,
  check: (input) => {
    const named = input.netlist.nets.filter((net) => namesOf(net).length > 0);
    const pairs = named.flatMap((a, index) => named.slice(index + 1).flatMap((b) => alike(input, [a, b])));
    const doubtful = new Set(pairs.flatMap(({ fewer, more }) => [fewer, more]));
    return [...pairs.map(judge), ...named.filter((net) => !doubtful.has(net)).map(clear)];
  },
};
