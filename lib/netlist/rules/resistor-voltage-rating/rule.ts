import { isOwnResistor } from '../../circuit/part-nature';
import { quantityOf } from '../../circuit/part-facts';
import { endNets } from '../../circuit/terminals';
import type { NetlistPart } from '../../netlist';
import type { Outcome, Rule, RuleInput } from '../rule';
import { magnitudeAcross } from '../support/resistor-heat';
import { voltageRating } from '../support/resistor-volts';
import { needsTransient, needsTransientOutcome } from '../support/needs-transient';
import { atPoint, atStation } from '../support/outcome';
import { crossingEvidence, crossingVolts, judgeStress, refusalWords, stressEvidence } from '../support/stress';
import { placeWords, say } from '../support/words';

const parameters = {
  anyResistor: { value: 50, unit: 'V', words: 'volts that every resistor stands, whatever its package', source: 'common practice, no source' },
} as const;

function resistorOutcomes({ circuit, points, parameters: { anyResistor } }: RuleInput<typeof parameters>, part: NetlistPart): readonly Outcome[] {
  const base = { severity: 'stop', target: { resistor: [part.id] }, refs: [part.ref], nets: [...(endNets(part) ?? [])] } as const;
  if (needsTransient(circuit, part)) return [needsTransientOutcome(part, 'volts', base)];
  const own = voltageRating(part);
  const rating = own ?? { value: anyResistor, source: 'least voltage rating of any resistor, assumed' };
  const measure = magnitudeAcross(part);
  const ohms = quantityOf(part, 'value');
  return points.stations.map((station) => {
    const verdict = judgeStress(points, station, measure, [
      { severity: 'stop', limit: rating.value, at: 'stated', source: rating.source },
      { severity: 'caution', limit: rating.value, at: 'raised', source: rating.source },
    ], { heat: false });
    if (!verdict) return atStation(station, { ...base, outcome: 'undetermined', message: `${part.ref}: no voltage computed: ${refusalWords(points, station)}`, evidence: [], missing: refusalWords(points, station) });
    const evidence = [stressEvidence(part.ref, 'voltage', 'V', verdict)];
    if (!verdict.severity) return atPoint(verdict.point, { ...base, outcome: 'pass', message: `${part.ref} stands ${say(verdict.value, 'V')} ${placeWords(verdict.point)} of ${say(rating.value, 'V')}`, evidence });
    if (!own) {
      return atPoint(verdict.point, {
        ...base, outcome: 'undetermined', missing: `${part.ref} vmax`,
        message: `Cannot decide without ${part.ref}’s voltage rating or package (vmax): ${say(verdict.value, 'V')} stand across it ${placeWords(verdict.point)}`,
        evidence: [{ ...evidence[0]!, limit: undefined, limitSource: undefined }],
      });
    }
    const pieces = Math.ceil((verdict.value * 1.1) / rating.value);
    return atPoint(verdict.point, {
      ...base, outcome: 'fail', severity: verdict.severity,
      evidence: [...evidence, ...crossingEvidence(part.ref, crossingVolts(points, measure, rating.value, { heat: false }))],
      message: `${say(verdict.value, 'V')} stand across ${part.ref} ${placeWords(verdict.point)}; it is rated ${say(rating.value, 'V')}`,
      remedy: { words: `Split it into ${pieces} in series${ohms ? ` of ${say(ohms / pieces, 'Ω')}` : ''}, or use a type for ${say(verdict.value * 1.1, 'V')}.` },
    });
  });
}

export const resistorVoltageRating: Rule<typeof parameters> = {
  id: 'resistor-voltage-rating', version: 1, title: 'Resistor voltage rating', severity: 'stop', needs: 'points', parameters,
  check: (input) => input.netlist.parts.filter(isOwnResistor).flatMap((part) => resistorOutcomes(input, part)),
};
