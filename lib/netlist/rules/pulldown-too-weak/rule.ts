import type { Circuit } from '../../circuit/circuit';
import type { ControllerPin } from '../../circuit/controller-pins';
import { magnitudeOf, originOf, quantityOf } from '../../circuit/part-facts';
import { isFet } from '../../circuit/part-nature';
import { railRange } from '../../circuit/rail-range';
import { breaksOn, type PullDown, type Stage } from '../../circuit/stages';
import type { Evidence } from '../../findings/finding';
import type { Outcome, Rule } from '../rule';
import { everywhere, missingFact } from '../support/outcome';
import { chooseOhms, leakageOf } from '../support/pull-down';
import { say } from '../support/words';

const parameters = {
  thresholdShare: { value: 0.5, unit: '', words: 'share of V_GS(th) minimum that an undriven gate may stand at', source: 'common practice, no source' },
} as const;

interface Lift {
  readonly volts: number;
  readonly words: string;
  /** Ohms below which it is harmless. */
  readonly below: (limit: number) => number;
}

function pullUpOf(circuit: Circuit, stage: Stage): { readonly pin: ControllerPin; readonly ohms: number; readonly volts: number } | null {
  for (const pin of circuit.controllerPins) {
    const ohms = pin.pullUp ? quantityOf(pin.pullUp, 'value') : undefined;
    if (!pin.pullUp || !ohms || pin.rail === null || !stage.reach.has(pin.net)) continue;
    return { pin, ohms, volts: railRange(circuit, pin.rail)?.high ?? 0 };
  }
  return null;
}

/** What lifts the gate while nothing drives it: the pin's own pull-up, else leakage. */
function liftOf(circuit: Circuit, stage: Stage, { ohms }: PullDown): Lift {
  const pullUp = pullUpOf(circuit, stage);
  const leakage = leakageOf(stage).amps;
  if (!pullUp) return { volts: leakage * ohms, words: `${say(leakage, 'A')} of leakage`, below: (limit) => limit / leakage };
  return {
    volts: (pullUp.volts * ohms) / (ohms + pullUp.ohms),
    words: `the pin’s own ${say(pullUp.ohms, 'Ω')} to ${say(pullUp.volts, 'V')}`,
    below: (limit) => (limit * pullUp.ohms) / Math.max(pullUp.volts - limit, 1e-9),
  };
}

function stageOutcome(circuit: Circuit, stage: Stage, thresholdShare: number): Outcome | null {
  const { transistor, pullDowns } = stage;
  const pullDown = [...pullDowns].sort((a, b) => a.ohms - b.ohms)[0];
  if (!pullDown || (breaksOn(stage).length > 0 && !pullUpOf(circuit, stage))) return null;
  const base = { severity: 'caution', target: { pulldown: [pullDown.part.id], transistor: [transistor.id] }, refs: [pullDown.part.ref, transistor.ref], nets: [pullDown.net] } as const;
  const fact = (['vth_min', 'vth_typ', 'vth_max'] as const).find((key) => magnitudeOf(transistor, key) !== undefined);
  if (!fact) return missingFact(transistor, 'vth_min', 'V_GS(th) minimum', base);
  const limit = (magnitudeOf(transistor, fact) ?? 0) * thresholdShare;
  const lift = liftOf(circuit, stage, pullDown);
  const fails = lift.volts > limit;
  if (!fails && fact !== 'vth_min') return missingFact(transistor, 'vth_min', 'V_GS(th) minimum', base);
  const evidence: readonly Evidence[] = [{
    entity: `${transistor.ref}:G`, quantity: 'voltage', value: lift.volts, unit: 'V', source: `${lift.words} against ${say(pullDown.ohms, 'Ω')}`,
    limit, limitSource: `${thresholdShare * 100} % of ${fact} of ${transistor.ref}, ${originOf(transistor, fact)}`,
  }];
  if (!fails) return everywhere({ ...base, outcome: 'pass', message: `${pullDown.part.ref} keeps ${transistor.ref} gate at ${say(lift.volts, 'V')}`, evidence });
  const below = lift.below(limit);
  const better = chooseOhms(stage, pullDown.net, { leakage: leakageOf(stage).amps, volts: limit, below });
  return everywhere({
    ...base, outcome: 'fail', state: 'high-z', evidence,
    message: `${pullDown.part.ref} is too weak: ${lift.words} lifts ${transistor.ref} gate to ${say(lift.volts, 'V')} while nothing drives it; it is on from ${say(limit / thresholdShare, 'V')}`,
    remedy: better === undefined ? { words: `Use less than ${say(below, 'Ω')} for ${pullDown.part.ref}.` }
      : { words: `Use ${say(better, 'Ω')} for ${pullDown.part.ref}.`, edits: [{ edit: 'set facts', part: pullDown.part.ref, facts: { value: better } }] },
  });
}

export const pulldownTooWeak: Rule<typeof parameters> = {
  id: 'pulldown-too-weak', version: 1, title: 'Pull-down too weak against a pull-up or leakage', severity: 'caution', needs: 'topology', parameters,
  check: ({ circuit, parameters: values }) => circuit.stages.filter((stage) => isFet(stage.transistor))
    .flatMap((stage) => stageOutcome(circuit, stage, values.thresholdShare) ?? []),
};
