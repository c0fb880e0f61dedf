import { netWords } from '../../connectivity/net-words';
import type { Circuit } from '../../circuit/circuit';
import { acrossFrom } from '../../circuit/graph';
import { magnitudeOf, originOf } from '../../circuit/part-facts';
import { isFet, isRemovable } from '../../circuit/part-nature';
import type { PullDown, Stage } from '../../circuit/stages';
import type { Severity } from '../../findings/finding';
import type { Outcome, Rule } from '../rule';
import { everywhere } from '../support/outcome';
import { frontOf, frontOhms } from '../support/pull-down';
import { say } from '../support/words';

const parameters = {
  adviceShare: { value: 0.005, unit: '', words: 'share of the drive that the divider may cost', source: 'common practice, no source' },
  cautionShare: { value: 0.1, unit: '', words: 'share from which the loss matters', source: 'common practice, no source' },
  clampShare: { value: 0.8, unit: '', words: 'share of V_GS maximum above which the divider protects the gate', source: 'common practice, no source' },
} as const;

type Values = { readonly [K in keyof typeof parameters]: number };

/** The divider protects the gate: without it the drive would pass 0.8 V_GS maximum, or a zener sets V_GS. */
export function dividerProtects(stage: Stage, clampShare: number): boolean {
  const rated = magnitudeOf(stage.transistor, 'vgs_max');
  return stage.clamps.length > 0 || (rated !== undefined && stage.control !== null && Math.abs(stage.control.high) > clampShare * rated);
}

/** Net just inside the driver: past every resistor between a pull-down and its control. */
function driverSide(stage: Stage, net: string): string {
  let at = net;
  for (const edge of frontOf(stage, net)) at = acrossFrom(edge, at);
  return at;
}

function pullDownOutcome({ netlist }: Circuit, stage: Stage, pullDown: PullDown, values: Values): Outcome | null {
  const { transistor, control } = stage;
  const front = frontOf(stage, pullDown.net);
  const resistors = front.filter((edge) => edge.nature === 'resistor');
  const broken = front.some((edge) => isRemovable(edge.part) || edge.part.kind === 'switch');
  if (!control || resistors.length === 0 || broken || dividerProtects(stage, values.clampShare)) return null;
  const series = frontOhms(stage, pullDown.net);
  const loss = series / (series + pullDown.ohms);
  const spec = magnitudeOf(transistor, 'rds_on_spec_vgs');
  const drive = Math.abs(control.high);
  const full = drive * (1 - loss);
  const starves = spec !== undefined && drive >= spec && full < spec && loss > values.adviceShare;
  const severity: Severity | null = loss > values.cautionShare || starves ? 'caution' : loss > values.adviceShare ? 'advice' : null;
  const base = { severity: 'caution' as Severity, target: { pulldown: [pullDown.part.id], transistor: [transistor.id] }, refs: [pullDown.part.ref, resistors[0]!.part.ref, transistor.ref], nets: [pullDown.net] };
  const limit = loss > values.cautionShare ? values.cautionShare : values.adviceShare;
  const evidence = [
    { entity: pullDown.part.ref, quantity: 'share of the drive lost', value: loss, unit: '', source: `${say(series, 'Ω')} against ${say(pullDown.ohms, 'Ω')}`, limit, limitSource: 'common practice, no source' },
    ...(starves && spec !== undefined ? [{
      entity: `${transistor.ref}:G`, quantity: 'gate drive', value: full, unit: 'V', source: `${control.levelsFrom}, divided`,
      limit: spec, limitSource: `V_GS at which R_DS(on) is stated, ${originOf(transistor, 'rds_on_spec_vgs')}`,
    }] : []),
  ];
  if (!severity) return everywhere({ ...base, outcome: 'pass', message: `${pullDown.part.ref} costs ${say(loss * 100, '%')} of the drive`, evidence });
  const net = driverSide(stage, pullDown.net);
  return everywhere({
    ...base, outcome: 'fail', severity, state: 'high', evidence,
    message: `Move ${pullDown.part.ref} to the driver’s side of ${resistors[0]!.part.ref}: there ${say(full, 'V')} becomes ${say(drive, 'V')}${starves ? `, and ${transistor.ref} wants ${say(spec ?? 0, 'V')}` : ''}`,
    remedy: { words: `Move ${pullDown.part.ref} from ${netWords(netlist, pullDown.net)} to ${netWords(netlist, net)}.`, edits: [{ edit: 'move pin', part: pullDown.part.ref, pin: pullDown.pin, net }] },
  });
}

export const pulldownGateSide: Rule<typeof parameters> = {
  id: 'pulldown-gate-side', version: 1, title: 'Pull-down on the gate’s side of the series resistor', severity: 'caution', needs: 'topology', parameters,
  check: ({ circuit, parameters: values }) => circuit.stages.filter((stage) => isFet(stage.transistor))
    .flatMap((stage) => stage.pullDowns.flatMap((pullDown) => pullDownOutcome(circuit, stage, pullDown, values) ?? [])),
};
