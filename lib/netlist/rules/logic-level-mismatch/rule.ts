import type { Stage } from '../../circuit/stages';
import { isSwitchedCoil } from '../../circuit/stages';
import { magnitudeOf, originOf } from '../../circuit/part-facts';
import { isFet, isUpperPolarity } from '../../circuit/part-nature';
import type { Evidence, Severity } from '../../findings/finding';
import type { FactKey } from '../../facts/fact-registry';
import { voltsOf, type RunPoint } from '../../points/point-set';
import type { Station } from '../../points/station';
import type { Outcome, Rule, RuleInput } from '../rule';
import { ampsInto } from '../support/led-current';
import { atPoint, atStation, everywhere } from '../support/outcome';
import { refusalWords } from '../support/stress';
import { pointWords, placeWords, say } from '../support/words';

const parameters = {
  aboveThreshold: { value: 0.5, unit: 'V', words: 'volts above V_GS(th) maximum below which the channel barely conducts', source: 'common practice, no source' },
  specShare: { value: 0.95, unit: '', words: 'share of the V_GS at which R_DS(on) is stated that the drive must reach', source: 'common practice, no source' },
  drivenVolts: { value: 0.3, unit: 'V', words: 'drive below which a gate counts as never driven', source: 'common practice, no source' },
} as const;

type Input = RuleInput<typeof parameters>;

/** Volts in the direction that turns the transistor on. */
const drive = ({ transistor, terminals }: Stage) => (point: RunPoint): number =>
  (voltsOf(point, terminals.control) - voltsOf(point, terminals.reference)) * (isUpperPolarity(transistor) ? -1 : 1);

function strongest({ points }: Input, stage: Stage, station: Station): { readonly point: RunPoint; readonly volts: number } | null {
  const states = points.at(station)
    .filter(({ key }) => (key.state === 'as drawn' || key.state === 'high' || key.state === 'low') && key.level !== '+10 %')
    .map((point) => ({ point, volts: drive(stage)(point) }))
    .filter(({ volts }) => Number.isFinite(volts));
  return states.reduce<{ point: RunPoint; volts: number } | null>((best, one) => (best === null || one.volts > best.volts ? one : best), null);
}

interface Bound {
  readonly fact: FactKey;
  readonly volts: number;
}

/** Highest threshold the part may have; a typical one stands for it where that can only make the verdict milder. */
function threshold(stage: Stage): Bound | null {
  for (const fact of ['vth_max', 'vth_typ', 'vth_min'] as const) {
    const volts = magnitudeOf(stage.transistor, fact);
    if (volts !== undefined) return { fact, volts };
  }
  return null;
}

/**
 * Most amps the channel can carry at this drive: KP/2·(V_GS − V_GS(th) maximum)², with KP = 1/(½·R_DS(on)·(V_spec − V_th))
 * (`docs/engine.md` 3.1).
 */
function saturationAmps(stage: Stage, volts: number): number | undefined {
  const [spec, rds, max] = [magnitudeOf(stage.transistor, 'rds_on_spec_vgs'), magnitudeOf(stage.transistor, 'rds_on'), magnitudeOf(stage.transistor, 'vth_max')];
  if (spec === undefined || rds === undefined || max === undefined || spec <= max) return undefined;
  const kp = 1 / (0.5 * rds * (spec - max));
  return volts <= max ? 0 : (kp / 2) * (volts - max) ** 2;
}

interface Decision {
  readonly severity: Severity | null;
  readonly missing?: FactKey;
  readonly evidence: readonly Evidence[];
}

function decide({ parameters: { aboveThreshold, specShare } }: Input, stage: Stage, { point, volts }: { point: RunPoint; volts: number }): Decision {
  const { transistor } = stage;
  const source = pointWords(point);
  const entity = `${transistor.ref}:G`;
  const bound = threshold(stage);
  const gate = (limit: number, limitSource: string): Evidence => ({ entity, quantity: 'gate drive', value: volts, unit: 'V', source, limit, limitSource });
  const low = bound ? gate(bound.volts + aboveThreshold, `${say(aboveThreshold, 'V')} above ${bound.fact} of ${transistor.ref}, ${originOf(transistor, bound.fact)}`) : null;
  if (bound && low && volts < bound.volts + aboveThreshold) return { severity: 'stop', evidence: [low] };
  const spec = magnitudeOf(transistor, 'rds_on_spec_vgs');
  const judged = !isSwitchedCoil(stage) && (!stage.inductive || stage.control !== null);
  const amps = judged ? Math.abs(ampsInto(point, transistor, 'D') ?? NaN) : undefined;
  const most = saturationAmps(stage, volts);
  // A gate at what its sheet asks for is driven well; too much current then has another cause.
  if (spec !== undefined && volts < spec * specShare && amps !== undefined && most !== undefined && amps > most) {
    return { severity: 'stop', evidence: [{ entity: transistor.ref, quantity: 'current', value: amps, unit: 'A', source, limit: most, limitSource: `saturation current at ${say(volts, 'V')} and V_GS(th) maximum` }] };
  }
  if (bound?.fact !== 'vth_max') return { severity: null, missing: 'vth_max', evidence: [] };
  if (spec === undefined) return { severity: null, missing: 'rds_on_spec_vgs', evidence: [] };
  const full = gate(spec * specShare, `${specShare * 100} % of the V_GS at which R_DS(on) of ${transistor.ref} is stated, ${originOf(transistor, 'rds_on_spec_vgs')}`);
  return { severity: volts < spec * specShare ? 'caution' : null, evidence: [full] };
}

function stageOutcomes(input: Input, stage: Stage): readonly Outcome[] {
  const { transistor, terminals } = stage;
  const base = { severity: 'stop' as Severity, target: { transistor: [transistor.id] }, refs: [transistor.ref, ...(stage.control ? [stage.control.part.ref] : [])], nets: [terminals.control] };
  return input.points.stations.map((station) => {
    const on = strongest(input, stage, station);
    if (!on) return atStation(station, { ...base, outcome: 'undetermined', message: `${transistor.ref}: no gate voltage computed: ${refusalWords(input.points, station)}`, evidence: [], missing: refusalWords(input.points, station) });
    if (on.volts < input.parameters.drivenVolts) {
      if (!stage.control) return everywhere({ ...base, outcome: 'not applicable', holdPoint: station.holdPoint, message: `${transistor.ref} is never driven on`, evidence: [] });
      const { ref } = stage.control.part;
      return atPoint(on.point, {
        ...base, outcome: 'undetermined', missing: `${ref} high`, evidence: [],
        message: `Cannot decide without ${ref}’s high level (high): nothing drawn turns ${transistor.ref} on`,
      });
    }
    const decision = decide(input, stage, on);
    if (decision.missing) {
      const words = decision.missing === 'vth_max' ? 'V_GS(th) maximum' : 'V_GS for R_DS(on)';
      return atPoint(on.point, {
        ...base, outcome: 'undetermined', missing: `${transistor.ref} ${decision.missing}`, evidence: [],
        message: `Cannot decide without ${transistor.ref}’s ${words} (${decision.missing}): its gate gets ${say(on.volts, 'V')}`,
      });
    }
    if (!decision.severity) return atPoint(on.point, { ...base, outcome: 'pass', message: `${transistor.ref} gets ${say(on.volts, 'V')} at its gate ${placeWords(on.point)}`, evidence: decision.evidence });
    const limit = decision.evidence[0]!;
    const starved = limit.quantity === 'current';
    return atPoint(on.point, {
      ...base, outcome: 'fail', severity: decision.severity, evidence: decision.evidence,
      message: starved
        ? `${transistor.ref} is to carry ${say(Number(limit.value), 'A')} ${placeWords(on.point)}; at ${say(on.volts, 'V')} of gate drive its channel gives ${say(limit.limit ?? 0, 'A')}`
        : decision.severity === 'stop'
          ? `${transistor.ref} gets ${say(on.volts, 'V')} at its gate ${placeWords(on.point)}: it barely conducts below ${say(limit.limit ?? 0, 'V')}`
          : `${transistor.ref} gets ${say(on.volts, 'V')} at its gate ${placeWords(on.point)}; its R_DS(on) is promised at ${say(magnitudeOf(transistor, 'rds_on_spec_vgs') ?? 0, 'V')} only`,
      remedy: { words: `Use a part whose sheet states R_DS(on) at ${say(on.volts, 'V')} or less, or drive the gate with ${say(magnitudeOf(transistor, 'rds_on_spec_vgs') ?? 10, 'V')}.` },
    });
  });
}

export const logicLevelMismatch: Rule<typeof parameters> = {
  id: 'logic-level-mismatch', version: 1, title: 'Gate drive below full enhancement', severity: 'stop', needs: 'points', parameters,
  check: (input) => input.circuit.stages.filter((stage) => isFet(stage.transistor)).flatMap((stage) => stageOutcomes(input, stage)),
};
