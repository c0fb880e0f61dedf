import { nearestUp } from '../../series/preferred-values';
import type { Stage } from '../../circuit/stages';
import { seriesOn } from '../../circuit/stages';
import { quantityOf } from '../../circuit/part-facts';
import type { NetlistPart } from '../../netlist';
import type { Remedy } from '../../findings/finding';
import { voltsOf, type RunPoint } from '../../points/point-set';
import type { Outcome, RuleInput } from '../rule';
import { atPoint, atStation, missingFact } from './outcome';
import { ratingOf } from './rating';
import { powerRating } from './resistor-heat';
import { crossingEvidence, crossingVolts, judgeStress, refusalWords, stressEvidence, type Measure } from './stress';
import { placeWords, say } from './words';

export const gateParameters = {
  cautionShare: { value: 0.8, unit: '', words: 'share of V_GS maximum that a drive may use', source: 'common practice, no source' },
} as const;

const gateVolts = ({ terminals }: Stage): Measure => (point) => Math.abs(voltsOf(point, terminals.control) - voltsOf(point, terminals.reference));

/** Zener voltages that gates are clamped at, volts. */
const clampVolts = [5.1, 6.8, 9.1, 12, 15, 18];

/** Whether the gate stands on the side of its source that turns the transistor on. */
function isForward({ terminals, transistor }: Stage, point: RunPoint): boolean {
  const volts = voltsOf(point, terminals.control) - voltsOf(point, terminals.reference);
  return transistor.kind === 'nmos' ? volts > 0 : volts < 0;
}

const clampWatts = 0.5;
/** Share of a rating that a proposed part is used to (common practice, no source). */
const usedShare = 0.6;

/** Whether a gate resistor and a zener of `clampWatts` stand the volts that the clamp leaves over, without end. */
function takesTheRest(resistor: NetlistPart, excess: number, vz: number): boolean {
  const ohms = quantityOf(resistor, 'value') ?? 0;
  if (ohms < 100 || excess <= 0) return false;
  const rated = powerRating(resistor)?.value ?? 0.125;
  return excess ** 2 / ohms <= rated * usedShare && (vz * excess) / ohms <= clampWatts * usedShare;
}

/** A zener from gate to source below the caution limit, where a gate resistor can take what is left; words otherwise. */
function remedyOf(stage: Stage, point: RunPoint, rated: number, share: number): Remedy {
  if (!isForward(stage, point)) return { words: `Keep the drive on one side of ${stage.transistor.ref}’s source, or clamp the gate both ways with two zeners in series.` };
  const vz = [...clampVolts].reverse().find((volts) => volts < rated * share * 0.98);
  const resistor = seriesOn(stage)[0];
  if (vz === undefined) return { words: 'Divide the drive down.' };
  const words = `Clamp the gate with a ${say(vz, 'V')} zener to the source, behind a series resistor`;
  const drive = Math.max(...(stage.control ? [stage.control.high, stage.control.low] : []).map(Math.abs), Math.abs(gateVolts(stage)(point) ?? 0));
  if (!resistor || !takesTheRest(resistor.part, drive - vz, vz)) {
    const ohms = nearestUp(Math.max(470, (drive - vz) ** 2 / (clampWatts * usedShare) * 2), 'E12');
    return { words: `${words} of ${say(ohms, 'Ω')} or more, or divide the drive down.` };
  }
  const { control, reference } = stage.terminals;
  const n = stage.transistor.kind === 'nmos';
  return {
    words: `${words} (${resistor.part.ref}).`,
    edits: [{ edit: 'add part', kind: 'zener', facts: { vz, pmax: clampWatts }, pins: n ? { A: reference, K: control } : { A: control, K: reference } }],
  };
}

/** |V_GS| of one MOSFET over every state against its rating: the peak decides, a duty cycle does not average an oxide. */
export function gateOutcomes({ points, parameters: { cautionShare } }: RuleInput<typeof gateParameters>, stage: Stage): readonly Outcome[] {
  const { transistor, terminals } = stage;
  const base = { severity: 'stop', target: { transistor: [transistor.id] }, refs: [transistor.ref, ...(stage.control ? [stage.control.part.ref] : [])], nets: [terminals.control] } as const;
  const rating = ratingOf(transistor, 'vgs_max', 'V_GS maximum');
  if (!rating) return [missingFact(transistor, 'vgs_max', 'V_GS maximum', base)];
  const measure = gateVolts(stage);
  return points.stations.map((station) => {
    const verdict = judgeStress(points, station, measure, [
      { severity: 'stop', limit: rating.value, at: 'stated', source: rating.source },
      { severity: 'caution', limit: rating.value * cautionShare, at: 'stated', source: `${cautionShare * 100} % of the ${rating.source}` },
      { severity: 'caution', limit: rating.value, at: 'raised', source: rating.source },
    ], { heat: false });
    if (!verdict) return atStation(station, { ...base, outcome: 'undetermined', message: `${transistor.ref}: no gate voltage computed: ${refusalWords(points, station)}`, evidence: [], missing: refusalWords(points, station) });
    const evidence = [stressEvidence(`${transistor.ref}:G`, 'V_GS', 'V', verdict), ...crossingEvidence(transistor.ref, verdict.severity ? crossingVolts(points, measure, verdict.limit.limit, { heat: false }) : undefined)];
    const stands = `${say(verdict.value, 'V')} from its source ${placeWords(verdict.point)}`;
    if (!verdict.severity) return atPoint(verdict.point, { ...base, outcome: 'pass', message: `${transistor.ref} gate stands at most ${stands} of ${say(rating.value, 'V')}`, evidence });
    const share = verdict.value / rating.value;
    return atPoint(verdict.point, {
      ...base, outcome: 'fail', severity: verdict.severity, evidence, remedy: remedyOf(stage, verdict.point, rating.value, cautionShare),
      message: `${transistor.ref} gate stands ${stands}: ${share > 1 ? `the oxide is rated ${say(rating.value, 'V')}` : `${say(share * 100, '%')} of its ${say(rating.value, 'V')}`}`,
    });
  });
}
