import type { Circuit } from '../../circuit/circuit';
import type { LedBranch } from '../../circuit/led-branches';
import { magnitudeOf } from '../../circuit/part-facts';
import { unlimitedVolts } from '../../circuit/unlimited-path';
import type { Remedy, Severity } from '../../findings/finding';
import type { Outcome, Rule } from '../rule';
import { branchRefs, branchTarget } from '../support/led-current';
import { chooseLedResistor } from '../support/led-resistor-choice';
import { everywhere } from '../support/outcome';
import { listWords, say } from '../support/words';

const parameters = {
  assumedIfMax: { value: 0.02, unit: 'A', words: 'I_F maximum taken for the proposed resistor where the LED gives none', source: 'sources.md 7: recommended 10 to 20 mA' },
  assumedVf: { value: 1.9, unit: 'V', words: 'V_F taken for the proposed resistor where the LED gives none', source: 'sources.md 7: red 1.7 to 2.0 V at 20 mA' },
} as const;

type Values = { readonly [K in keyof typeof parameters]: number };

function freshNet(circuit: Circuit, wanted: string): string {
  let name = wanted;
  for (let count = 2; circuit.net(name); count += 1) name = `${wanted}_${count}`;
  return name;
}

function remedyOf(circuit: Circuit, branch: LedBranch, volts: number, values: Values): Remedy {
  const led = branch.leds[0]!;
  const left = volts * 1.1 - branch.leds.reduce((sum, one) => sum + (magnitudeOf(one, 'vf') ?? values.assumedVf), 0);
  const choice = left > 0 ? chooseLedResistor(left, magnitudeOf(led, 'if_max') ?? values.assumedIfMax) : undefined;
  if (!choice) return { words: `Put a resistor in series with ${led.ref}.` };
  const net = freshNet(circuit, `${led.ref}_A`);
  return {
    words: `Put ${say(choice.ohms, 'Ω')}, ${say(choice.pmax, 'W')} in series with ${led.ref} (${say(choice.amps, 'A')}).`,
    edits: [
      { edit: 'add part', kind: 'resistor', facts: { value: choice.ohms, pmax: choice.pmax }, pins: { 1: led.pins.A ?? '', 2: net } },
      { edit: 'move pin', part: led.ref, pin: 'A', net },
    ],
  };
}

function outcomeOf(circuit: Circuit, branch: LedBranch, values: Values): Outcome {
  const names = listWords(branch.leds.map((led) => led.ref));
  const base = { severity: 'stop' as Severity, target: branchTarget(branch), refs: branchRefs(branch) };
  const volts = Math.max(...branch.leds.map((led) => unlimitedVolts(circuit, led) ?? 0));
  const count = (value: number) => ({
    entity: branch.leds[0]!.ref, quantity: 'series resistors', value, unit: '', source: 'connections', limit: 1, limitSource: 'an LED’s current rises tenfold in tenths of a volt: something must set it',
  });
  if (volts === 0) {
    return everywhere({ ...base, outcome: 'pass', message: `${names}: the path has a resistor`, evidence: [count(Math.max(1, branch.resistors.length))] });
  }
  const forward = branch.leds.reduce((sum, led) => sum + (magnitudeOf(led, 'vf') ?? 0), 0);
  return everywhere({
    ...base, outcome: 'fail', severity: volts <= forward ? 'caution' : 'stop',
    refs: [...branch.leds, ...branch.transistors].map((part) => part.ref),
    message: `${names} has no resistor in its path: ${say(volts, 'V')} stand across it and nothing sets the current`,
    evidence: [count(0), { entity: branch.leds[0]!.ref, quantity: 'voltage', value: volts, unit: 'V', source: 'source values' }],
    remedy: volts <= forward ? { words: `Put some tens of ohms in series with ${branch.leds[0]!.ref}: a fresh cell gives more than its name.` } : remedyOf(circuit, branch, volts, values),
  });
}

export const ledResistorMissing: Rule<typeof parameters> = {
  id: 'led-resistor-missing', version: 1, title: 'LED without a series resistor', severity: 'stop', needs: 'topology', parameters,
  check: ({ circuit, parameters: values }) => circuit.ledBranches.map((branch) => outcomeOf(circuit, branch, values)),
};
