import type { Circuit } from '../../circuit/circuit';
import { isOwnResistor } from '../../circuit/part-nature';
import { quantityOf } from '../../circuit/part-facts';
import type { Evidence } from '../../findings/finding';
import type { NetlistPart } from '../../netlist';
import type { PointSet } from '../../points/point-set';
import type { Station } from '../../points/station';
import type { Outcome, Rule, RuleInput } from '../rule';
import { ledAmps, ledLimitSource, weakestLed } from '../support/led-current';
import { everywhere, atPoint } from '../support/outcome';
import { heatLimits, magnitudeAcross, powerRating, resistorWatts } from '../support/resistor-heat';
import { voltageRating } from '../support/resistor-volts';
import { crossingEvidence, crossingVolts, judgeStress, nominalWorst, stressEvidence, type Measure, type StressLimit, type StressVerdict } from '../support/stress';
import { listWords, placeWords, say, stationWords } from '../support/words';

const parameters = {
  stopFactor: { value: 1.5, unit: '', words: 'share of I_F maximum from which an LED’s resistor is far too small', source: 'common practice, no source' },
} as const;

/** Parts that are sized together: an indicator, or the resistors of a gate network. */
interface Group {
  readonly parts: readonly NetlistPart[];
  readonly transistors: readonly NetlistPart[];
}

/** One stress of one part of a group. */
interface Stress {
  readonly part: NetlistPart;
  readonly quantity: 'current' | 'power' | 'voltage';
  readonly unit: 'A' | 'W' | 'V';
  readonly measure: Measure;
  readonly heat: boolean;
  limits(station: Station): readonly StressLimit[];
  /** Rating as messages print it, in `unit`. */
  readonly rated: number;
  /** Volts of the source at which the rating is reached. */
  crossing(): number | undefined;
}

function groupsOf(circuit: Circuit): readonly Group[] {
  const indicators = circuit.ledBranches.map((branch): Group => ({ parts: [...branch.resistors, ...branch.leds], transistors: branch.transistors }));
  const taken = new Set(indicators.flatMap((group) => group.parts.map((part) => part.id)));
  const networks = circuit.stages.map((stage): Group => {
    const near = [...stage.reach.keys()].filter((net) => !circuit.rails.has(net)).flatMap((net) => circuit.graph.edgesAt(net));
    const resistors = [...new Set(near.map((edge) => edge.part))].filter((part) => isOwnResistor(part) && !taken.has(part.id));
    return { parts: resistors, transistors: [stage.transistor] };
  });
  return [...indicators, ...networks].filter((group) => group.parts.length > 0);
}

function resistorStresses(circuit: Circuit, points: PointSet, part: NetlistPart): readonly Stress[] {
  const ohms = quantityOf(part, 'value');
  const [power, volts] = [powerRating(part), voltageRating(part)];
  const across = magnitudeAcross(part);
  return [
    ...(power && ohms ? [{
      part, quantity: 'power', unit: 'W', measure: resistorWatts(circuit, points, part), heat: true, rated: power.value,
      limits: (station: Station) => heatLimits(power, station, { cautionShare: 1, adviceShare: 1 }).slice(0, 1),
      crossing: () => crossingVolts(points, across, Math.sqrt(power.value * ohms), { heat: true }),
    } as const] : []),
    ...(volts ? [{
      part, quantity: 'voltage', unit: 'V', measure: across, heat: false, rated: volts.value,
      limits: () => [{ severity: 'stop', limit: volts.value, at: 'stated', source: volts.source } as const],
      crossing: () => crossingVolts(points, across, volts.value, { heat: false }),
    } as const] : []),
  ];
}

function stressesOf({ circuit, points, parameters: { stopFactor } }: RuleInput<typeof parameters>, group: Group): readonly Stress[] {
  const leds = group.parts.filter((part) => part.kind === 'led');
  const branch = circuit.ledBranches.find((one) => one.leds.some((led) => leds.includes(led)));
  const weakest = branch ? weakestLed(branch) : null;
  const current: readonly Stress[] = weakest && 'led' in weakest ? [{
    part: weakest.led, quantity: 'current', unit: 'A', measure: ledAmps(weakest.led), heat: true, rated: weakest.amps,
    limits: () => [{ severity: 'stop', limit: weakest.amps * stopFactor, at: 'stated', source: ledLimitSource(weakest.led, stopFactor) }],
    crossing: () => crossingVolts(points, ledAmps(weakest.led), weakest.amps, { heat: true }),
  }] : [];
  return [...group.parts.filter(isOwnResistor).flatMap((part) => resistorStresses(circuit, points, part)), ...current];
}

interface Judged {
  readonly stress: Stress;
  readonly verdict: StressVerdict;
}

function judgeAt(points: PointSet, stresses: readonly Stress[], station: Station): readonly Judged[] {
  return stresses.flatMap((stress) => {
    const verdict = judgeStress(points, station, stress.measure, stress.limits(station), { heat: stress.heat });
    return verdict ? [{ stress, verdict }] : [];
  });
}

const overWords = ({ stress }: Judged): string => {
  const from = stress.crossing();
  return `${stress.part.ref} over its ${say(stress.rated, stress.unit)}${from === undefined ? '' : ` from ${say(from, 'V')}`}`;
};

/** A stress at another place of the plan, for comparison. */
const reading = ({ stress, verdict }: Judged, where: string): Evidence => ({
  entity: stress.part.ref, quantity: `${stress.quantity} ${where}`, value: verdict.value, unit: stress.unit,
  source: `operating point ${placeWords(verdict.point)}`,
});

/** Amps and watts at a station's stated value: `269 mA in D1 and 87 W from R1`. */
function readings(points: PointSet, station: Station, stresses: readonly Stress[]): string {
  const shown = [...stresses.filter(({ quantity }) => quantity === 'current'), ...stresses.filter(({ quantity }) => quantity === 'power')];
  return listWords(shown.flatMap((stress) => {
    const value = nominalWorst(points, station, stress.measure, stress);
    return value === undefined ? [] : [`${say(value, stress.unit)} ${stress.quantity === 'current' ? 'in' : 'from'} ${stress.part.ref}`];
  }));
}

function groupOutcome(input: RuleInput<typeof parameters>, group: Group): Outcome {
  const { points } = input;
  const stresses = stressesOf(input, group);
  const base = {
    severity: 'stop', target: { part: group.parts.map((part) => part.id) },
    refs: [...group.parts, ...group.transistors].map((part) => part.ref),
  } as const;
  const byStation = points.stations.map((station) => judgeAt(points, stresses, station));
  const failing = byStation.findIndex((judged) => judged.some(({ verdict }) => verdict.severity !== null));
  if (stresses.length === 0) {
    return everywhere({ ...base, outcome: 'undetermined', message: `Cannot decide without the ratings of ${listWords(base.refs)}`, evidence: [], missing: `${group.parts[0]!.ref} ratings` });
  }
  const calm = byStation[0] ?? [];
  if (failing < 0) {
    return everywhere({
      ...base, outcome: 'pass', message: `${listWords(base.refs)}: within limits at every hold point`,
      evidence: (byStation[byStation.length - 1] ?? []).map(({ stress, verdict }) => stressEvidence(stress.part.ref, stress.quantity, stress.unit, verdict)),
    });
  }
  if (failing === 0 || calm.length === 0) {
    return everywhere({ ...base, outcome: 'not applicable', message: `${listWords(base.refs)}: no lower hold point passes`, evidence: [] });
  }
  return failOutcome(points, group, base, byStation, failing);
}

function failOutcome(points: PointSet, group: Group, base: Pick<Outcome, 'severity' | 'target' | 'refs'>, byStation: readonly (readonly Judged[])[], failing: number): Outcome {
  const top = byStation.length - 1;
  const over = (byStation[top] ?? []).filter(({ verdict }) => verdict.severity !== null);
  const first = byStation[failing]!.filter(({ verdict }) => verdict.severity !== null);
  const decisive = first[0]!;
  const lastGood = points.stations[failing - 1]!;
  const said = over.length > 0 ? over : first;
  const indicator = group.parts.some((part) => part.kind === 'led');
  const concerned = indicator ? group.parts : group.parts.filter((part) => [...first, ...over].some(({ stress }) => stress.part === part));
  const names = listWords(concerned.map((part) => part.ref));
  const evidence: readonly Evidence[] = [
    ...first.map(({ stress, verdict }) => stressEvidence(stress.part.ref, stress.quantity, stress.unit, verdict)),
    ...said.flatMap(({ stress }) => crossingEvidence(stress.part.ref, stress.crossing())).sort((a, b) => Number(a.value) - Number(b.value)),
    ...(byStation[failing - 1] ?? []).map((judged) => reading(judged, 'within limits')),
    ...(failing === top ? [] : over.map((judged) => reading(judged, 'at the top of the plan'))),
  ];
  const quoted = (byStation[top] ?? []).map(({ stress }) => stress).filter(({ part }) => concerned.includes(part));
  const topWords = stationWords(points.stations[top]!);
  return atPoint(decisive.verdict.point, {
    ...base, outcome: 'fail', evidence, refs: [...concerned, ...group.transistors].map((part) => part.ref),
    message: `${names} ${concerned.length > 1 ? 'suit' : 'suits'} ${say(lastGood.volts ?? 0, 'V')} only: ${said.map(overWords).join('; ')}. `
      + `${topWords[0]!.toUpperCase()}${topWords.slice(1)}: ${readings(points, points.stations[top]!, quoted)}. Within limits ${stationWords(lastGood)}: ${readings(points, lastGood, quoted)}`,
    remedy: { words: indicator
      ? 'Feed the indicator from a low-voltage supply of its own, or size it for the highest hold point and accept that it glows dimly at the first.'
      : 'Size the network for the highest hold point, or feed the gate from a supply of its own.' },
  });
}

export const indicatorAtStage: Rule<typeof parameters> = {
  id: 'indicator-at-stage', version: 1, title: 'Sized for one hold point, fails at a later one', severity: 'stop', needs: 'points', parameters,
  check: (input) => (input.points.stations.length < 2 ? [] : groupsOf(input.circuit).map((group) => groupOutcome(input, group))),
};
