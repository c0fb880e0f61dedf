import type { LedBranch } from '../../circuit/led-branches';
import { magnitudeOf, originOf } from '../../circuit/part-facts';
import type { Severity } from '../../findings/finding';
import { voltsOf, type RunPoint } from '../../points/point-set';
import type { Station } from '../../points/station';
import type { Outcome, Rule, RuleInput } from '../rule';
import { ampsInto, branchRefs, branchTarget } from '../support/led-current';
import { atPoint, everywhere, missingFact } from '../support/outcome';
import { pointWords, listWords, placeWords, say } from '../support/words';

const parameters = {
  adviceShare: { value: 0.9, unit: '', words: 'share of the path’s volts that the LEDs may take', source: 'common practice, no source' },
  cautionShare: { value: 1, unit: '', words: 'share from which the LEDs cannot reach their current at all', source: 'common practice, no source' },
  litAmps: { value: 1e-5, unit: 'A', words: 'current from which a path counts as switched on', source: 'common practice, no source' },
} as const;

type Input = RuleInput<typeof parameters>;

const pathVolts = (branch: LedBranch) => (point: RunPoint): number => voltsOf(point, branch.ends[0]) - voltsOf(point, branch.ends[1]);

/** The point at which the path has most volts while it conducts: the state in which the LEDs are meant to be lit. */
function litPoint({ points, parameters: { litAmps } }: Input, branch: LedBranch, station: Station): { readonly point: RunPoint; readonly volts: number } | null {
  const lit = points.at(station)
    .filter((point) => point.key.level === 'nominal' && (ampsInto(point, branch.leds[0]!, 'A') ?? 0) > litAmps)
    .map((point) => ({ point, volts: pathVolts(branch)(point) }))
    .filter(({ volts }) => volts > 0)
    .sort((a, b) => b.volts - a.volts);
  return lit[0] ?? null;
}

function branchOutcomes(input: Input, branch: LedBranch): readonly Outcome[] {
  const { points, parameters: { adviceShare, cautionShare } } = input;
  const base = { severity: 'caution' as Severity, target: branchTarget(branch), refs: branchRefs(branch) };
  const silent = branch.leds.find((led) => magnitudeOf(led, 'vf') === undefined);
  if (silent) return [missingFact(silent, 'vf', 'V_F', base)];
  const forward = branch.leds.reduce((sum, led) => sum + (magnitudeOf(led, 'vf') ?? 0), 0);
  const names = listWords(branch.leds.map((led) => led.ref));
  return points.stations.map((station) => {
    const lit = litPoint(input, branch, station);
    if (!lit) return everywhere({ ...base, outcome: 'not applicable', holdPoint: station.holdPoint, scenario: station.scenario, message: `${names} is not lit here`, evidence: [] });
    const { point, volts } = lit;
    const severity: Severity | null = forward >= cautionShare * volts ? 'caution' : forward > adviceShare * volts ? 'advice' : null;
    const share = severity === 'caution' ? cautionShare : adviceShare;
    const evidence = [
      {
        // At exactly all of the volts it fails: nothing is left for the resistor.
        entity: names, quantity: 'forward voltage', value: severity === 'caution' ? Math.max(forward, share * volts * (1 + 1e-12)) : forward, unit: 'V',
        source: `V_F of ${names}, ${originOf(branch.leds[0]!, 'vf')}`,
        limit: share * volts, limitSource: `${share * 100} % of the ${say(volts, 'V')} across the path`,
      },
      { entity: names, quantity: 'voltage', value: volts, unit: 'V', source: pointWords(point) },
    ];
    if (!severity) return atPoint(point, { ...base, outcome: 'pass', message: `${names}: ${say(volts - forward, 'V')} are left for the resistor ${placeWords(point)}`, evidence });
    return atPoint(point, {
      ...base, outcome: 'fail', severity, evidence,
      message: severity === 'caution'
        ? `${names} ${branch.leds.length > 1 ? 'want' : 'wants'} ${say(forward, 'V')} and ${say(volts, 'V')} are there ${placeWords(point)}: ${branch.leds.length > 1 ? 'they' : 'it'} will hardly light`
        : `${names} ${branch.leds.length > 1 ? 'take' : 'takes'} ${say(forward, 'V')} of ${say(volts, 'V')} ${placeWords(point)}: the current hangs on a few tenths of a volt`,
      remedy: { words: branch.leds.length > 1 ? 'Take an LED out of the string, or feed it from a higher voltage.' : 'Use an LED of lower V_F, or feed it from a higher voltage.' },
    });
  });
}

export const ledStringHeadroom: Rule<typeof parameters> = {
  id: 'led-string-headroom', version: 1, title: 'LEDs take nearly all of the voltage', severity: 'caution', needs: 'points', parameters,
  check: (input) => input.circuit.ledBranches.filter((branch) => branch.resistors.length > 0).flatMap((branch) => branchOutcomes(input, branch)),
};
