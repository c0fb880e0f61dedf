import { isOwnResistor } from '../../circuit/part-nature';
import { quantityOf } from '../../circuit/part-facts';
import { endNets } from '../../circuit/terminals';
import type { Remedy } from '../../findings/finding';
import type { NetlistPart } from '../../netlist';
import type { Outcome, Rule, RuleInput } from '../rule';
import { needsTransient, needsTransientOutcome } from '../support/needs-transient';
import { heatLimits, magnitudeAcross, powerRating, resistorWatts } from '../support/resistor-heat';
import { wattsFor } from '../support/led-resistor-choice';
import { atPoint, atStation, missingFact } from '../support/outcome';
import { crossingEvidence, crossingVolts, judgeStress, refusalWords, stressEvidence } from '../support/stress';
import { placeWords, say } from '../support/words';

const parameters = {
  cautionShare: { value: 0.85, unit: '', words: 'share of the rating from which a resistor runs hot', source: 'common practice, no source' },
  adviceShare: { value: 0.6, unit: '', words: 'share of the rating from which a larger one is advised', source: 'common practice, no source' },
} as const;

function remedyOf(part: NetlistPart, watts: number): Remedy {
  const pmax = wattsFor(watts);
  if (pmax === undefined) return { words: `No ordinary resistor sheds ${say(watts, 'W')}: raise the value or feed it from less.` };
  return { words: `Use ${say(pmax, 'W')} for ${part.ref}, or raise the value.`, edits: [{ edit: 'set facts', part: part.ref, facts: { pmax } }] };
}

function resistorOutcomes({ circuit, points, parameters: shares }: RuleInput<typeof parameters>, part: NetlistPart): readonly Outcome[] {
  const base = { severity: 'stop', target: { resistor: [part.id] }, refs: [part.ref], nets: [...(endNets(part) ?? [])] } as const;
  const ohms = quantityOf(part, 'value');
  if (ohms === undefined || ohms <= 0) return [missingFact(part, 'value', 'resistance', base)];
  const rating = powerRating(part);
  if (!rating) return [missingFact(part, 'pmax', 'power rating or package', base)];
  if (needsTransient(circuit, part)) return [needsTransientOutcome(part, 'watts', base)];
  const watts = resistorWatts(circuit, points, part);
  const worst = Math.max(0, ...points.ok.filter((point) => !point.staticOn).map((point) => watts(point) ?? 0));
  return points.stations.map((station) => {
    const verdict = judgeStress(points, station, watts, heatLimits(rating, station, shares), { heat: true });
    if (!verdict) return atStation(station, { ...base, outcome: 'undetermined', message: `${part.ref}: no watts computed: ${refusalWords(points, station)}`, evidence: [], missing: refusalWords(points, station) });
    const crossing = verdict.severity ? crossingVolts(points, magnitudeAcross(part), Math.sqrt(verdict.limit.limit * ohms), { heat: true }) : undefined;
    const evidence = [stressEvidence(part.ref, 'power', 'W', verdict), ...crossingEvidence(part.ref, crossing)];
    if (!verdict.severity) return atPoint(verdict.point, { ...base, outcome: 'pass', message: `${part.ref} sheds ${say(verdict.value, 'W')} ${placeWords(verdict.point)} of ${say(rating.value, 'W')}`, evidence });
    const share = verdict.value / rating.value;
    return atPoint(verdict.point, {
      ...base, outcome: 'fail', severity: verdict.severity, evidence, remedy: remedyOf(part, worst),
      message: share > 1
        ? `${part.ref} sheds ${say(verdict.value, 'W')} ${placeWords(verdict.point)} in a ${say(rating.value, 'W')} part`
        : `${part.ref} sheds ${say(verdict.value, 'W')} ${placeWords(verdict.point)}: ${say(share * 100, '%')} of its ${say(rating.value, 'W')}`,
    });
  });
}

export const resistorDissipation: Rule<typeof parameters> = {
  id: 'resistor-dissipation', version: 1, title: 'Resistor dissipation', severity: 'stop', needs: 'points', parameters,
  check: (input) => input.netlist.parts.filter(isOwnResistor).flatMap((part) => resistorOutcomes(input, part)),
};
