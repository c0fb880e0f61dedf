import { isCapacitor } from '../../circuit/part-nature';
import { magnitudeOf, originOf } from '../../circuit/part-facts';
import { isAlternating } from '../../circuit/source-role';
import { endNets } from '../../circuit/terminals';
import type { NetlistPart } from '../../netlist';
import { nearestUp } from '../../series/preferred-values';
import type { Outcome, Rule, RuleInput } from '../rule';
import { voltsAcross } from '../support/alternating';
import { isMainsFed } from '../support/mains';
import { needsTransient, needsTransientOutcome } from '../support/needs-transient';
import { atPoint, atStation, missingFact } from '../support/outcome';
import { ratingOf } from '../support/rating';
import { crossingEvidence, crossingVolts, judgeStress, refusalWords, stressEvidence, type Measure, type StressLimit } from '../support/stress';
import { placeWords, say } from '../support/words';

const parameters = {
  cautionShare: { value: 0.8, unit: '', words: 'share of the rating that a capacitor may stand in normal use', source: 'sources.md 1.2: aluminium electrolytic 80 %, benign' },
  noLoadFactor: { value: 1.1, unit: '', words: 'rise of a transformer’s voltage without load', source: 'common practice, no source' },
} as const;

type Input = RuleInput<typeof parameters>;

/** A capacitor behind a rectifier of an alternating source that is no mains stands at the unloaded winding's peak. */
function noLoad({ circuit, parameters: { noLoadFactor } }: Input, part: NetlistPart): number {
  return circuit.sources.supplies.some(isAlternating) && (endNets(part) ?? []).some((net) => circuit.smoothedNets.has(net)) ? noLoadFactor : 1;
}

function limitsOf({ parameters: { cautionShare } }: Input, part: NetlistPart): readonly StressLimit[] | null {
  const alternating = magnitudeOf(part, 'vmax_ac');
  const rating = ratingOf(part, 'vmax', 'voltage rating');
  if (rating) {
    return [
      { severity: 'stop', limit: rating.value, at: 'stated', source: rating.source },
      { severity: 'caution', limit: rating.value * cautionShare, at: 'stated', source: `${cautionShare * 100} % of the ${rating.source}` },
      { severity: 'caution', limit: rating.value, at: 'raised', source: rating.source },
    ];
  }
  if (alternating === undefined) return null;
  return [{ severity: 'stop', limit: alternating * Math.SQRT2, at: 'stated', source: `√2 × AC voltage rating of ${part.ref}, ${originOf(part, 'vmax_ac')}` }];
}

function capacitorOutcomes(input: Input, part: NetlistPart): readonly Outcome[] {
  const { points, parameters: { cautionShare } } = input;
  const base = { severity: 'stop', target: { capacitor: [part.id] }, refs: [part.ref], nets: [...(endNets(part) ?? [])] } as const;
  const limits = limitsOf(input, part);
  if (!limits) return [missingFact(part, 'vmax', 'voltage rating', base)];
  if (needsTransient(input.circuit, part)) return [needsTransientOutcome(part, 'volts', base)];
  const factor = noLoad(input, part);
  const measure: Measure = (point) => {
    const volts = voltsAcross(point, part);
    return volts === undefined ? undefined : Math.abs(volts) * factor;
  };
  const rated = limits[0]!.limit;
  return points.stations.map((station) => {
    const verdict = judgeStress(points, station, measure, limits, { heat: false });
    if (!verdict) return atStation(station, { ...base, outcome: 'undetermined', message: `${part.ref}: no voltage computed: ${refusalWords(points, station)}`, evidence: [], missing: refusalWords(points, station) });
    const evidence = [stressEvidence(part.ref, 'voltage', 'V', verdict), ...crossingEvidence(part.ref, verdict.severity ? crossingVolts(points, measure, verdict.limit.limit, { heat: false }) : undefined)];
    const unloaded = factor > 1 ? ', unloaded' : '';
    if (!verdict.severity) return atPoint(verdict.point, { ...base, outcome: 'pass', message: `${part.ref} stands ${say(verdict.value, 'V')}${unloaded} ${placeWords(verdict.point)} of ${say(rated, 'V')}`, evidence });
    const share = verdict.value / rated;
    const wanted = nearestUp(verdict.value / cautionShare, 'E6');
    return atPoint(verdict.point, {
      ...base, outcome: 'fail', severity: verdict.severity, evidence,
      message: share > 1
        ? `${part.ref} stands ${say(verdict.value, 'V')}${unloaded} ${placeWords(verdict.point)}; it is rated ${say(rated, 'V')}`
        : `${part.ref} stands ${say(verdict.value, 'V')}${unloaded} ${placeWords(verdict.point)}: ${say(share * 100, '%')} of its ${say(rated, 'V')}`,
      remedy: { words: `Fit a part rated ${say(wanted, 'V')} or more.` },
    });
  });
}

export const capVoltageRating: Rule<typeof parameters> = {
  id: 'cap-voltage-rating', version: 1, title: 'Capacitor voltage rating', severity: 'stop', needs: 'points', parameters,
  check: (input) => input.netlist.parts.filter((part) => isCapacitor(part) && !isMainsFed(input.circuit, part)).flatMap((part) => capacitorOutcomes(input, part)),
};
