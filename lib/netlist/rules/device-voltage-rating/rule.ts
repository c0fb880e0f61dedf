import type { Outcome, Rule, RuleInput } from '../rule';
import { blockingParts, type Blocking } from '../support/device-stress';
import { isMainsFed } from '../support/mains';
import { needsTransient, needsTransientOutcome } from '../support/needs-transient';
import { atPoint, atStation, missingFact } from '../support/outcome';
import { ratingOf } from '../support/rating';
import { crossingEvidence, crossingVolts, judgeStress, refusalWords, stressEvidence } from '../support/stress';
import { placeWords, say } from '../support/words';

const parameters = {
  cautionShare: { value: 0.8, unit: '', words: 'share of the rating that a switch or diode may block in normal use', source: 'ECSS-Q-ST-30-11C V_DS 80 %, from memory' },
} as const;

function deviceOutcomes({ circuit, points, parameters: { cautionShare } }: RuleInput<typeof parameters>, device: Blocking): readonly Outcome[] {
  const { part, measure, across, clampVolts } = device;
  const base = { severity: 'stop', target: { device: [part.id] }, refs: [part.ref] } as const;
  const rating = ratingOf(part, device.fact, device.words);
  if (!rating) return [missingFact(part, device.fact, device.words, base)];
  if (needsTransient(circuit, part)) return [needsTransientOutcome(part, 'volts', base)];
  const clamp = clampVolts > 0 ? `, ${say(clampVolts, 'V')} of its clamp included` : '';
  return points.stations.map((station) => {
    const verdict = judgeStress(points, station, measure, [
      { severity: 'stop', limit: rating.value, at: 'stated', source: rating.source },
      { severity: 'caution', limit: rating.value * cautionShare, at: 'stated', source: `${cautionShare * 100} % of the ${rating.source}` },
      { severity: 'caution', limit: rating.value, at: 'raised', source: rating.source },
    ], { heat: false });
    if (!verdict) return atStation(station, { ...base, outcome: 'undetermined', message: `${part.ref}: no voltage computed: ${refusalWords(points, station)}`, evidence: [], missing: refusalWords(points, station) });
    const evidence = [stressEvidence(part.ref, across, 'V', verdict), ...crossingEvidence(part.ref, verdict.severity ? crossingVolts(points, measure, verdict.limit.limit, { heat: false }) : undefined)];
    if (!verdict.severity) return atPoint(verdict.point, { ...base, outcome: 'pass', message: `${part.ref} blocks ${say(Math.max(0, verdict.value), 'V')} ${placeWords(verdict.point)} of ${say(rating.value, 'V')}`, evidence });
    const share = verdict.value / rating.value;
    return atPoint(verdict.point, {
      ...base, outcome: 'fail', severity: verdict.severity, evidence,
      message: share > 1
        ? `${part.ref} is to block ${say(verdict.value, 'V')} ${placeWords(verdict.point)}${clamp}; it is rated ${say(rating.value, 'V')}`
        : `${part.ref} blocks ${say(verdict.value, 'V')} ${placeWords(verdict.point)}${clamp}: ${say(share * 100, '%')} of its ${say(rating.value, 'V')}`,
      remedy: { words: `Use a part rated ${say(verdict.value / cautionShare, 'V')} or more.` },
    });
  });
}

export const deviceVoltageRating: Rule<typeof parameters> = {
  id: 'device-voltage-rating', version: 1, title: 'Voltage rating of switch or diode', severity: 'stop', needs: 'points', parameters,
  check: (input) => blockingParts(input.circuit).filter(({ part }) => !isMainsFed(input.circuit, part)).flatMap((device) => deviceOutcomes(input, device)),
};
