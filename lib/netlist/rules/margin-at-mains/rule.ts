import { isCapacitor } from '../../circuit/part-nature';
import { magnitudeOf, originOf } from '../../circuit/part-facts';
import type { NetlistPart } from '../../netlist';
import type { Outcome, Rule, RuleInput } from '../rule';
import { blockingParts } from '../support/device-stress';
import { isMainsFed } from '../support/mains';
import { needsTransient, needsTransientOutcome } from '../support/needs-transient';
import { atPoint, atStation, missingFact } from '../support/outcome';
import { ratingOf } from '../support/rating';
import { magnitudeAcross } from '../support/resistor-heat';
import { crossingEvidence, crossingVolts, judgeStress, refusalWords, stressEvidence, type Measure, type StressLimit } from '../support/stress';
import { placeWords, say } from '../support/words';
import { cautionFields } from './caution-fields';

const parameters = {
  deviceShare: { value: 0.8, unit: '', words: 'share of V_DS, V_CEO or V_RRM that may be used on the mains', source: 'ECSS-Q-ST-30-11C V_DS 80 %, from memory' },
  capacitorShare: { value: 0.8, unit: '', words: 'share of a capacitor’s rating that may be used on the mains', source: 'sources.md 1.2: aluminium electrolytic 80 %, benign' },
  ringing: { value: 0.05, unit: '', words: 'ringing on top of the bus where a coil is switched, as a share of it, until a transient is run', source: 'common practice, no source' },
} as const;

type Input = RuleInput<typeof parameters>;

interface Margin {
  readonly part: NetlistPart;
  readonly quantity: string;
  readonly rating: { readonly value: number; readonly source: string };
  readonly share: number;
  readonly measure: Measure;
  /** With ringing: decides cautions only, because it is assumed. */
  readonly rung: Measure;
  readonly added: string;
}

function deviceMargins({ circuit, parameters: { deviceShare, ringing } }: Input): readonly (Margin | Outcome)[] {
  return blockingParts(circuit).filter(({ part }) => isMainsFed(circuit, part)).map((device) => {
    const { part, measure, clampVolts, inductive, across } = device;
    const rating = ratingOf(part, device.fact, device.words);
    if (!rating) return missingFact(part, device.fact, device.words, { severity: 'stop', target: { part: [part.id] }, refs: [part.ref] });
    const rung: Measure = (point) => {
      const volts = measure(point);
      return volts === undefined || !inductive ? volts : volts + (volts - clampVolts) * ringing;
    };
    const words = [...(clampVolts > 0 ? [`${say(clampVolts, 'V')} of its clamp`] : []), ...(inductive ? [`${say(ringing * 100, '%')} ringing`] : [])];
    return { part, quantity: across, rating, share: deviceShare, measure, rung, added: words.length > 0 ? ` with ${words.join(' and ')}` : '' };
  });
}

function capacitorMargins({ circuit, netlist, parameters: { capacitorShare } }: Input): readonly (Margin | Outcome)[] {
  return netlist.parts.filter((part) => isCapacitor(part) && isMainsFed(circuit, part)).map((part) => {
    const measure = magnitudeAcross(part);
    const alternating = magnitudeOf(part, 'vmax_ac');
    const rating = ratingOf(part, 'vmax', 'voltage rating')
      ?? (alternating === undefined ? undefined : { value: alternating * Math.SQRT2, source: `√2 × AC voltage rating of ${part.ref}, ${originOf(part, 'vmax_ac')}` });
    if (!rating) return missingFact(part, 'vmax', 'voltage rating', { severity: 'stop', target: { part: [part.id] }, refs: [part.ref] });
    return { part, quantity: 'voltage', rating, share: part.facts.vmax === undefined ? 1 : capacitorShare, measure, rung: measure, added: '' };
  });
}

function marginOutcomes({ circuit, points }: Input, { part, quantity, rating, share, measure, rung, added }: Margin): readonly Outcome[] {
  const base = { severity: 'stop', target: { part: [part.id] }, refs: [part.ref] } as const;
  if (needsTransient(circuit, part)) return [needsTransientOutcome(part, 'volts', base)];
  const stop: StressLimit = { severity: 'stop', limit: rating.value, at: 'stated', source: rating.source };
  const caution: StressLimit = { severity: 'caution', limit: rating.value * share, at: 'stated', source: `${share * 100} % of the ${rating.source}` };
  return points.stations.map((station) => {
    const plain = judgeStress(points, station, measure, [stop], { heat: false });
    const verdict = plain?.severity ? plain : judgeStress(points, station, rung, [caution], { heat: false });
    if (!verdict) return atStation(station, { ...base, outcome: 'undetermined', message: `${part.ref}: no voltage computed: ${refusalWords(points, station)}`, evidence: [], missing: refusalWords(points, station) });
    const used = plain?.severity ? measure : rung;
    const evidence = [stressEvidence(part.ref, quantity, 'V', verdict), ...crossingEvidence(part.ref, verdict.severity ? crossingVolts(points, used, verdict.limit.limit, { heat: false }) : undefined)];
    if (!verdict.severity) return atPoint(verdict.point, { ...base, outcome: 'pass', message: `${part.ref} sees ${say(Math.max(0, verdict.value), 'V')}${added} ${placeWords(verdict.point)} of ${say(rating.value, 'V')}`, evidence });
    return atPoint(verdict.point, {
      ...base, outcome: 'fail', severity: verdict.severity, confidence: verdict.severity === 'stop' ? 'proven' : 'likely', evidence,
      message: verdict.severity === 'stop'
        ? `${part.ref} sees ${say(verdict.value, 'V')} ${placeWords(verdict.point)}; it is rated ${say(rating.value, 'V')}`
        : `${part.ref} sees ${say(verdict.value, 'V')}${added} ${placeWords(verdict.point)}: ${say((verdict.value / rating.value) * 100, '%')} of its ${say(rating.value, 'V')}, ${say(share * 100, '%')} is the limit on the mains`,
      remedy: { words: `Use a part rated ${say(verdict.value / share, 'V')} or more.` },
    });
  });
}

export const marginAtMains: Rule<typeof parameters> = {
  id: 'margin-at-mains', version: 1, title: 'Voltage margin on the mains', severity: 'stop', needs: 'points', parameters,
  check: (input) => [
    ...[...deviceMargins(input), ...capacitorMargins(input)].flatMap((one) => ('outcome' in one ? [one] : marginOutcomes(input, one))),
    ...cautionFields(input.circuit, input.points.stations),
  ],
};
