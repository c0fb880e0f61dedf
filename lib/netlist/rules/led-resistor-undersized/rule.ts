import type { LedBranch } from '../../circuit/led-branches';
import { unlimitedVolts } from '../../circuit/unlimited-path';
import type { Outcome, Rule, RuleInput } from '../rule';
import { voltsAcross } from '../support/alternating';
import { needsTransient, needsTransientOutcome } from '../support/needs-transient';
import { branchRefs, branchTarget, ledAmps, undersizedLimit, weakestLed } from '../support/led-current';
import { resizeRemedy } from '../support/led-resistor-choice';
import { atPoint, atStation, missingFact } from '../support/outcome';
import { crossingEvidence, crossingVolts, judgeStress, refusalWords, stressEvidence } from '../support/stress';
import { listWords, placeWords, say } from '../support/words';

const parameters = {
  stopFactor: { value: 1.5, unit: '', words: 'share of I_F maximum from which the resistor is far too small', source: 'common practice, no source' },
} as const;

function branchOutcomes({ circuit, points, parameters: { stopFactor } }: RuleInput<typeof parameters>, branch: LedBranch): readonly Outcome[] {
  const base = { severity: 'stop', target: branchTarget(branch), refs: branchRefs(branch) } as const;
  const weakest = weakestLed(branch);
  if ('missing' in weakest) return [missingFact(weakest.missing, 'if_max', 'I_F maximum', base)];
  const { led, amps } = weakest;
  if (needsTransient(circuit, led)) return [needsTransientOutcome(led, 'current', base)];
  const limits = [undersizedLimit(led, amps, stopFactor)];
  const names = listWords(branch.resistors.map((part) => part.ref));
  const top = Math.max(0, ...points.ok.filter((point) => !point.staticOn)
    .map((point) => Math.abs(branch.resistors.reduce((sum, part) => sum + Math.abs(voltsAcross(point, part) ?? 0), 0))));
  return points.stations.map((station) => {
    const verdict = judgeStress(points, station, ledAmps(led), limits, { heat: true });
    if (!verdict) return atStation(station, { ...base, outcome: 'undetermined', message: `${led.ref}: no current computed: ${refusalWords(points, station)}`, evidence: [], missing: refusalWords(points, station) });
    const evidence = [stressEvidence(led.ref, 'current', 'A', verdict), ...crossingEvidence(led.ref, verdict.severity ? crossingVolts(points, ledAmps(led), amps, { heat: true }) : undefined)];
    if (!verdict.severity) return atPoint(verdict.point, { ...base, outcome: 'pass', message: `${led.ref} carries ${say(verdict.value, 'A')} ${placeWords(verdict.point)}`, evidence });
    const over = `${say(verdict.value / amps, '')} times its ${say(amps, 'A')}`;
    return atPoint(verdict.point, {
      ...base, outcome: 'fail', evidence, remedy: resizeRemedy(branch, top, amps),
      message: names === ''
        ? `${led.ref} carries ${say(verdict.value, 'A')} ${placeWords(verdict.point)} without a resistor of its own: ${over}`
        : `${names} ${branch.resistors.length > 1 ? 'let' : 'lets'} ${say(verdict.value, 'A')} through ${led.ref} ${placeWords(verdict.point)}: ${over}`,
    });
  });
}

export const ledResistorUndersized: Rule<typeof parameters> = {
  id: 'led-resistor-undersized', version: 1, title: 'LED resistor far too small', severity: 'stop', needs: 'points', parameters,
  check: (input) => input.circuit.ledBranches
    .filter((branch) => branch.leds.every((led) => unlimitedVolts(input.circuit, led) === null))
    .flatMap((branch) => branchOutcomes(input, branch)),
};
