import { magnitudeOf, originOf } from '../../circuit/part-facts';
import type { NetlistPart } from '../../netlist';
import { voltsOf, type RunPoint } from '../../points/point-set';
import type { Outcome, Rule, RuleInput } from '../rule';
import { needsTransient, needsTransientOutcome } from '../support/needs-transient';
import { atPoint, atStation, everywhere } from '../support/outcome';
import { crossingEvidence, crossingVolts, judgeStress, refusalWords, stressEvidence } from '../support/stress';
import { placeWords, say } from '../support/words';

const parameters = {
  assumedVr: { value: 5, unit: 'V', words: 'reverse voltage that an LED stands where its sheet gives none', source: 'sources.md 7: V_R 5 V of every indicator sheet listed there' },
} as const;

const reverse = (led: NetlistPart) => (point: RunPoint): number => voltsOf(point, led.pins.K ?? '') - voltsOf(point, led.pins.A ?? '');

function ledOutcomes({ circuit, points, parameters: { assumedVr } }: RuleInput<typeof parameters>, led: NetlistPart): readonly Outcome[] {
  const branch = circuit.ledBranches.find((one) => one.leds.includes(led));
  const base = { severity: 'stop', target: { led: [led.id] }, refs: [led.ref, ...(branch?.resistors ?? []).slice(0, 1).map((part) => part.ref)] } as const;
  const own = magnitudeOf(led, 'vr_max');
  const blocking = branch?.parts.find((part) => part.kind === 'diode' || part.kind === 'schottky');
  if (blocking) {
    return [everywhere({ ...base, outcome: 'not applicable', message: `${led.ref}: ${blocking.ref} in series blocks for it, and lets no more than its leakage through`, evidence: [] })];
  }
  if (needsTransient(circuit, led)) return [needsTransientOutcome(led, 'reverse volts', base)];
  const limit = own ?? assumedVr;
  const source = own === undefined ? 'V_R of indicator LEDs, assumed' : `V_R maximum of ${led.ref}, ${originOf(led, 'vr_max')}`;
  const confidence = own === undefined ? 'likely' : 'proven';
  const limits = [{ severity: 'stop', limit, at: 'stated', source }, { severity: 'caution', limit, at: 'raised', source }] as const;
  const anode = led.pins.A ?? '';
  const cathode = led.pins.K ?? '';
  return points.stations.map((station) => {
    const verdict = judgeStress(points, station, reverse(led), limits, { heat: false });
    if (!verdict) return atStation(station, { ...base, outcome: 'undetermined', message: `${led.ref}: no voltage computed: ${refusalWords(points, station)}`, evidence: [], missing: refusalWords(points, station) });
    const evidence = [stressEvidence(led.ref, 'reverse voltage', 'V', verdict), ...crossingEvidence(led.ref, verdict.severity ? crossingVolts(points, reverse(led), limit, { heat: false }) : undefined)];
    if (!verdict.severity) return atPoint(verdict.point, { ...base, outcome: 'pass', confidence, message: `${led.ref} sees at most ${say(Math.max(0, verdict.value), 'V')} backwards ${placeWords(verdict.point)}`, evidence });
    return atPoint(verdict.point, {
      ...base, outcome: 'fail', confidence, severity: verdict.severity, nets: [anode, cathode], evidence,
      message: `${led.ref} stands ${say(verdict.value, 'V')} backwards ${placeWords(verdict.point)}; an LED bears ${say(limit, 'V')}`,
      remedy: {
        words: `Put a small diode across ${led.ref}, the other way round.`,
        edits: [{ edit: 'add part', kind: 'diode', facts: { vr_max: 100, if_max: 0.2, vf: 0.7, part: '1N4148' }, pins: { A: cathode, K: anode } }],
      },
    });
  });
}

export const ledReverseVoltage: Rule<typeof parameters> = {
  id: 'led-reverse-voltage', version: 1, title: 'LED reverse voltage', severity: 'stop', needs: 'points', parameters,
  check: (input) => input.netlist.parts.filter((part) => part.kind === 'led').flatMap((led) => ledOutcomes(input, led)),
};
