import type { LedBranch } from '../../circuit/led-branches';
import { unlimitedVolts } from '../../circuit/unlimited-path';
import type { Control } from '../../circuit/sources';
import { walk } from '../../circuit/walk';
import type { Outcome, Rule, RuleInput } from '../rule';
import { voltsAcross } from '../support/alternating';
import { needsTransient, needsTransientOutcome } from '../support/needs-transient';
import { ampsInto, branchRefs, branchTarget, ledAmps, ledLimitSource, weakestLed } from '../support/led-current';
import { resizeRemedy } from '../support/led-resistor-choice';
import { driverLimit } from '../support/driver-limit';
import { atPoint, atStation, missingFact } from '../support/outcome';
import type { Rating } from '../support/rating';
import { crossingEvidence, crossingVolts, judgeStress, refusalWords, stressEvidence, type StressLimit } from '../support/stress';
import { placeWords, say } from '../support/words';

const parameters = {
  stopFactor: { value: 1.5, unit: '', words: 'share of I_F maximum above which led-resistor-undersized speaks', source: 'common practice, no source' },
  pinShare: { value: 0.9, unit: '', words: 'share of a pin’s current limit that an LED may take', source: 'common practice, no source' },
} as const;

type Input = RuleInput<typeof parameters>;

/** The control that feeds a branch straight, with what it can give. */
function pinOf({ circuit }: Input, branch: LedBranch): { readonly control: Control; readonly limit: Rating } | null {
  for (const control of circuit.sources.controls) {
    const limit = driverLimit(control);
    if (!limit) continue;
    const reached = walk(circuit.graph, control.out, { through: ({ nature }) => nature === 'joint', stopAt: () => false });
    if (branch.ends.some((net) => net !== '0' && reached.has(net))) return { control, limit };
  }
  return null;
}

function branchOutcomes(input: Input, branch: LedBranch): readonly Outcome[] {
  const { circuit, points, parameters: { stopFactor, pinShare } } = input;
  const base = { severity: 'caution', target: branchTarget(branch), refs: branchRefs(branch) } as const;
  const weakest = weakestLed(branch);
  if ('missing' in weakest) return [missingFact(weakest.missing, 'if_max', 'I_F maximum', base)];
  const { led, amps } = weakest;
  if (needsTransient(circuit, led)) return [needsTransientOutcome(led, 'current', base)];
  const limits: readonly StressLimit[] = [
    { severity: 'caution', limit: amps, at: 'stated', source: ledLimitSource(led, 1) },
    { severity: 'caution', limit: amps, at: 'raised', source: ledLimitSource(led, 1) },
  ];
  const pin = pinOf(input, branch);
  const pinLimits: readonly StressLimit[] = pin ? [{ severity: 'caution', limit: pin.limit.value * pinShare, at: 'stated', source: `${pinShare} × ${pin.limit.source}` }] : [];
  const top = Math.max(0, ...points.ok.filter((point) => !point.staticOn).map((point) => branch.resistors.reduce((sum, part) => sum + Math.abs(voltsAcross(point, part) ?? 0), 0)));
  return points.stations.map((station) => {
    const verdict = judgeStress(points, station, ledAmps(led), limits, { heat: true });
    if (!verdict) return atStation(station, { ...base, outcome: 'undetermined', message: `${led.ref}: no current computed: ${refusalWords(points, station)}`, evidence: [], missing: refusalWords(points, station) });
    const evidence = [stressEvidence(led.ref, 'current', 'A', verdict)];
    const farOver = verdict.severity !== null && verdict.point.stated && verdict.value > amps * stopFactor;
    const crossing = verdict.severity ? crossingVolts(points, ledAmps(led), amps, { heat: true }) : undefined;
    if (verdict.severity && !farOver) {
      return atPoint(verdict.point, {
        ...base, outcome: 'fail', evidence: [...evidence, ...crossingEvidence(led.ref, crossing)], remedy: resizeRemedy(branch, top, amps),
        message: `${led.ref} carries ${say(verdict.value, 'A')} ${placeWords(verdict.point)}, its maximum is ${say(amps, 'A')}`,
      });
    }
    const atPin = pin ? judgeStress(points, station, (point) => Math.abs(ampsInto(point, pin.control.part, '+') ?? 0), pinLimits, { heat: true }) : null;
    if (pin && atPin?.severity) {
      return atPoint(atPin.point, {
        ...base, outcome: 'fail', confidence: pin.limit.source.endsWith('assumed') ? 'likely' : 'proven', refs: [...branchRefs(branch), pin.control.part.ref], evidence: [stressEvidence(pin.control.part.ref, 'current', 'A', atPin)],
        remedy: resizeRemedy(branch, top, Math.min(amps, pin.limit.value)),
        message: `${pin.control.part.ref} gives ${say(atPin.value, 'A')} to ${led.ref} ${placeWords(atPin.point)}: more than ${pinShare * 100} % of its ${say(pin.limit.value, 'A')}`,
      });
    }
    if (farOver) return atPoint(verdict.point, { ...base, outcome: 'not applicable', message: `${led.ref}: led-resistor-undersized speaks of it`, evidence: [] });
    return atPoint(verdict.point, { ...base, outcome: 'pass', message: `${led.ref} carries ${say(verdict.value, 'A')} ${placeWords(verdict.point)} of ${say(amps, 'A')}`, evidence });
  });
}

export const ledOvercurrent: Rule<typeof parameters> = {
  id: 'led-overcurrent', version: 1, title: 'LED above its current rating', severity: 'caution', needs: 'points', parameters,
  check: (input) => input.circuit.ledBranches
    .filter((branch) => branch.leds.every((led) => unlimitedVolts(input.circuit, led) === null))
    .flatMap((branch) => branchOutcomes(input, branch)),
};
