import type { Circuit } from '../../circuit/circuit';
import { driverOf, gateOhms, type Driver } from '../../circuit/gate-path';
import { isClosed, isFet } from '../../circuit/part-nature';
import type { Stage } from '../../circuit/stages';
import type { Confidence, Severity } from '../../findings/finding';
import { magnitudeOf } from '../../circuit/part-facts';
import type { Outcome, Rule } from '../rule';
import { everywhere } from '../support/outcome';
import { leakageOf, pullDownRemedy } from '../support/pull-down';
import { listWords } from '../support/words';

const parameters = {
  thresholdShare: { value: 0.1, unit: '', words: 'share of V_GS(th) minimum that leakage through the proposed resistor may make', source: 'engine.md 3.6' },
  assumedThreshold: { value: 1, unit: 'V', words: 'V_GS(th) minimum taken for the proposed resistor where none is given', source: 'common practice, no source' },
} as const;

type Values = { readonly [K in keyof typeof parameters]: number };

interface Verdict {
  readonly severity: Severity;
  readonly state: Outcome['state'];
  readonly words: string;
  readonly confidence?: Confidence;
  readonly refs?: readonly string[];
}

const terminalWords = (stage: Stage) => (isFet(stage.transistor) ? { control: 'gate', reference: 'source' } : { control: 'base', reference: 'emitter' });

/** What a driver without a DC path of its own leaves the gate to. */
function undriven(stage: Stage, driver: Driver): Verdict | null {
  const { control, reference } = terminalWords(stage);
  const name = stage.transistor.ref;
  switch (driver) {
    case 'nothing': return { severity: 'stop', state: 'as drawn', words: `${name} ${control} has no DC path to ${reference}: nothing drives it, it drifts and ${name} half conducts` };
    case 'junction': return { severity: 'stop', state: 'as drawn', confidence: 'likely', words: `${name} ${control} hangs on a diode alone: nothing pulls it back to ${reference}` };
    case 'one transistor': return { severity: 'stop', state: 'as drawn', confidence: 'likely', words: `${name} ${control} has no DC path to ${reference} while the transistor that drives it is off` };
    case 'pin': return { severity: 'caution', state: 'high-z', words: `${name} ${control} floats until the controller’s pin drives it: in reset, while it is programmed, without supply` };
    default: return null;
  }
}

/** A gate that is driven as drawn, with its switches opened and its controls at high impedance. */
function whenReleased(circuit: Circuit, stage: Stage): Verdict | null {
  const { control, reference } = terminalWords(stage);
  const name = stage.transistor.ref;
  const switches = stage.reach.size > 0 ? circuit.netlist.parts.filter((part) => part.kind === 'switch' && isClosed(part)) : [];
  const controls = circuit.sources.controls.map(({ part }) => part);
  if (switches.length > 0 && !Number.isFinite(gateOhms(stage, new Set(switches.map((part) => part.id))))) {
    return { severity: 'stop', state: 'as drawn', words: `${name} ${control} has no DC path to ${reference} once ${listWords(switches.map((part) => part.ref))} is open`, refs: switches.map((part) => part.ref) };
  }
  if (!isFet(stage.transistor) || !stage.control) return null;
  if (Number.isFinite(gateOhms(stage, new Set(controls.map((part) => part.id))))) return null;
  return { severity: 'caution', state: 'high-z', words: `${name} ${control} floats while ${stage.control.part.ref} is at high impedance: no resistor ties it to ${reference}`, refs: [stage.control.part.ref] };
}

function verdictOf(circuit: Circuit, stage: Stage): Verdict | 'not examined' | null {
  if (Number.isFinite(gateOhms(stage))) return whenReleased(circuit, stage);
  const driver = driverOf(circuit, stage);
  return driver === 'not examined' ? 'not examined' : undriven(stage, driver);
}

function stageOutcome(circuit: Circuit, stage: Stage, values: Values): Outcome {
  const { transistor, terminals } = stage;
  const { control } = terminalWords(stage);
  const base = { severity: 'stop', target: { transistor: [transistor.id] }, refs: [transistor.ref], nets: [terminals.control] } as const;
  const verdict = verdictOf(circuit, stage);
  const paths = (value: number) => ({ entity: `${transistor.ref}:${terminals.controlPin}`, quantity: 'DC paths', value, unit: '', source: 'connections', limit: 1, limitSource: `an undriven ${control} must be kept off` });
  if (verdict === 'not examined') {
    return everywhere({
      ...base, outcome: 'undetermined', evidence: [], missing: 'a part not examined',
      message: `Cannot decide what drives ${transistor.ref}’s ${control}: a part that is not examined is joined to it`,
    });
  }
  if (!verdict) return everywhere({ ...base, outcome: 'pass', message: `${transistor.ref} ${control} has a DC path in every state`, evidence: [paths(1)] });
  const threshold = isFet(transistor) ? magnitudeOf(transistor, 'vth_min') ?? magnitudeOf(transistor, 'vth_typ') ?? values.assumedThreshold : 0.4;
  return everywhere({
    ...base, outcome: 'fail', severity: verdict.severity, state: verdict.state, confidence: verdict.confidence ?? 'proven',
    refs: [transistor.ref, ...(verdict.refs ?? [])], message: verdict.words, evidence: [paths(0)],
    remedy: pullDownRemedy(circuit, stage, { leakage: leakageOf(stage).amps, volts: threshold * values.thresholdShare }),
  });
}

export const gateFloating: Rule<typeof parameters> = {
  id: 'gate-floating', version: 1, title: 'Floating gate or base', severity: 'stop', needs: 'topology', parameters,
  check: ({ circuit, parameters: values }) => circuit.stages.map((stage) => stageOutcome(circuit, stage, values)),
};
