import { isFet } from '../../circuit/part-nature';
import type { PullDown, Stage } from '../../circuit/stages';
import type { Outcome, Rule } from '../rule';
import { dividerProtects } from '../pulldown-gate-side/rule';
import { driverLimit } from '../support/driver-limit';
import { everywhere } from '../support/outcome';
import { chooseOhms, frontOhms, leakageOf } from '../support/pull-down';
import { say } from '../support/words';

const parameters = {
  driveShare: { value: 0.1, unit: '', words: 'share of the drive that the divider may cost', source: 'common practice, no source' },
  driverShare: { value: 0.25, unit: '', words: 'share of the driver’s current limit that a pull-down may take', source: 'common practice, no source' },
  clampShare: { value: 0.8, unit: '', words: 'share of V_GS maximum above which the divider protects the gate', source: 'common practice, no source' },
} as const;

type Values = { readonly [K in keyof typeof parameters]: number };

function pullDownOutcome(stage: Stage, pullDown: PullDown, values: Values): Outcome | null {
  const { control, transistor } = stage;
  if (!control || dividerProtects(stage, values.clampShare)) return null;
  const series = frontOhms(stage, pullDown.net);
  const loss = series / (series + pullDown.ohms);
  const amps = Math.abs(control.high) / (series + pullDown.ohms);
  const limit = driverLimit(control);
  const base = { severity: 'caution', target: { pulldown: [pullDown.part.id], transistor: [transistor.id] }, refs: [pullDown.part.ref, transistor.ref, control.part.ref], nets: [pullDown.net] } as const;
  const evidence = [
    { entity: pullDown.part.ref, quantity: 'share of the drive lost', value: loss, unit: '', source: `${say(series, 'Ω')} against ${say(pullDown.ohms, 'Ω')}`, limit: values.driveShare, limitSource: 'common practice, no source' },
    ...(limit ? [{
      entity: control.part.ref, quantity: 'current', value: amps, unit: 'A',
      source: `${control.levelsFrom} over ${say(series + pullDown.ohms, 'Ω')}`,
      limit: limit.value * values.driverShare, limitSource: `${values.driverShare * 100} % of the ${limit.source}`,
    }] : []),
  ];
  const starves = loss > values.driveShare;
  const drains = limit !== undefined && amps > limit.value * values.driverShare;
  if (!starves && !drains) return everywhere({ ...base, outcome: 'pass', message: `${pullDown.part.ref} takes ${say(amps, 'A')} and ${say(loss * 100, '%')} of the drive`, evidence });
  const better = chooseOhms(stage, pullDown.net, { leakage: leakageOf(stage).amps, volts: Infinity });
  return everywhere({
    ...base, outcome: 'fail', state: 'high', evidence, confidence: limit?.source.endsWith('assumed') && !starves ? 'likely' : 'proven',
    message: starves
      ? `${pullDown.part.ref} takes ${say(loss * 100, '%')} of the drive from ${transistor.ref}: ${say(pullDown.ohms, 'Ω')} behind ${say(series, 'Ω')}`
      : `${pullDown.part.ref} draws ${say(amps, 'A')} from ${control.part.ref}, more than a quarter of the ${say(limit?.value ?? 0, 'A')} it can give`,
    remedy: better === undefined ? { words: `Raise ${pullDown.part.ref}.` }
      : { words: `Use ${say(better, 'Ω')} for ${pullDown.part.ref}.`, edits: [{ edit: 'set facts', part: pullDown.part.ref, facts: { value: better } }] },
  });
}

export const pulldownTooStrong: Rule<typeof parameters> = {
  id: 'pulldown-too-strong', version: 1, title: 'Pull-down too strong for the driver', severity: 'caution', needs: 'topology', parameters,
  check: ({ circuit, parameters: values }) => circuit.stages.filter((stage) => isFet(stage.transistor))
    .flatMap((stage) => stage.pullDowns.flatMap((pullDown) => pullDownOutcome(stage, pullDown, values) ?? [])),
};
