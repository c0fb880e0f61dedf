import type { Circuit } from '../../circuit/circuit';
import { gateOhms } from '../../circuit/gate-path';
import type { LeadGroup } from '../../circuit/leads';
import { magnitudeOf, originOf } from '../../circuit/part-facts';
import { isFet } from '../../circuit/part-nature';
import { walk } from '../../circuit/walk';
import type { Stage } from '../../circuit/stages';
import type { Evidence, Severity } from '../../findings/finding';
import type { Outcome, Rule } from '../rule';
import { everywhere, missingFact } from '../support/outcome';
import { leakageOf, pullDownRemedy } from '../support/pull-down';
import { listWords, say } from '../support/words';

const parameters = {
  stopShare: { value: 0.5, unit: '', words: 'share of V_GS(th) minimum that leakage may make', source: 'engine.md 3.6' },
  cautionShare: { value: 0.1, unit: '', words: 'share from which leakage is worth a caution', source: 'engine.md 3.6' },
  baseOff: { value: 0.4, unit: 'V', words: 'V_BE below which a bipolar transistor is off', source: 'engine.md 3.6' },
} as const;

type Values = { readonly [K in keyof typeof parameters]: number };

interface Lifted {
  readonly lead: LeadGroup;
  readonly ohms: number;
}

/**
 * Ohms from gate to source with a lead off. Where the lead takes the source pin itself away from everything, the
 * transistor cannot conduct and a path from its gate to any rail is enough.
 */
function ohmsWithout(circuit: Circuit, stage: Stage, lead: LeadGroup): number {
  const gone = new Set(lead.parts.map((part) => part.id));
  const ohms = gateOhms(stage, gone);
  if (Number.isFinite(ohms)) return ohms;
  const reached = (start: string) => [...walk(circuit.graph, start, {
    through: (edge) => !gone.has(edge.part.id) && (edge.nature === 'resistor' || edge.nature === 'joint' || edge.nature === 'coil' || edge.nature === 'source'),
  }).keys()];
  const { reference, control } = stage.terminals;
  const cutOff = !reached(reference).includes('0');
  return cutOff && reached(control).includes('0') ? 0 : Infinity;
}

const terminalWords = (stage: Stage) => (isFet(stage.transistor) ? { control: 'gate', reference: 'source' } : { control: 'base', reference: 'emitter' });

/** Pull-downs that come off with the lead, because they sit on its far side. */
const farPullDowns = (circuit: Circuit, stage: Stage): readonly string[] => stage.pullDowns
  .filter(({ part, net }) => circuit.leads.some((lead) => lead.parts.some((piece) => stage.reach.get(net)?.via?.part.id === piece.id)) && part.kind === 'resistor')
  .map(({ part }) => part.ref);

function openOutcome(circuit: Circuit, stage: Stage, leads: readonly LeadGroup[], off: number, cautionShare: number): Outcome {
  const { transistor, terminals } = stage;
  const { control, reference } = terminalWords(stage);
  const names = leads.map((lead) => lead.name);
  const far = farPullDowns(circuit, stage);
  return everywhere({
    outcome: 'fail', severity: 'stop', state: `lifted ${names[0] ?? ''}`,
    target: { transistor: [transistor.id] }, refs: [...names.slice(0, 2), transistor.ref, ...far.slice(0, 1)], nets: [terminals.control],
    message: `${listWords(names).replace(' and ', ' or ')} lifted: ${transistor.ref} ${control} has no DC path to ${reference}${far.length > 0 ? `; ${far[0]} comes off with the lead` : ''}`,
    evidence: [{ entity: `${transistor.ref}:${terminals.controlPin}`, quantity: 'DC paths', value: 0, unit: '', source: `connections with ${names[0] ?? ''} lifted`, limit: 1, limitSource: `an undriven ${control} must be kept off` }],
    remedy: pullDownRemedy(circuit, stage, { leakage: leakageOf(stage).amps, volts: off * cautionShare }),
  });
}

/** Volts that turn the transistor on at worst, and the fact they come from. */
function offVolts(stage: Stage, { baseOff }: Values): { readonly volts: number; readonly fact: string; readonly certain: boolean } | null {
  if (!isFet(stage.transistor)) return { volts: baseOff, fact: 'V_BE of an off transistor, engine.md 3.6', certain: true };
  for (const fact of ['vth_min', 'vth_typ', 'vth_max'] as const) {
    const volts = magnitudeOf(stage.transistor, fact);
    if (volts !== undefined) return { volts, fact: `${fact} of ${stage.transistor.ref}, ${originOf(stage.transistor, fact)}`, certain: fact === 'vth_min' };
  }
  return null;
}

/** Slowest bus rise in V/s that could turn the transistor on: V_GS(th) minimum / (R·C_rss). */
function withstands(stage: Stage, ohms: number, volts: number): readonly Evidence[] {
  const crss = magnitudeOf(stage.transistor, 'crss');
  if (crss === undefined || crss === 0 || ohms === 0) return [];
  return [{ entity: stage.transistor.ref, quantity: 'bus rise withstood', value: volts / (ohms * crss), unit: 'V/s', source: `V_GS(th) minimum / (${say(ohms, 'Ω')} × C_rss)` }];
}

function resistiveOutcome(circuit: Circuit, stage: Stage, { lead, ohms }: Lifted, values: Values): Outcome {
  const { transistor, terminals } = stage;
  const { control, reference } = terminalWords(stage);
  const base = {
    severity: 'stop' as Severity, target: { transistor: [transistor.id] }, nets: [terminals.control], state: `lifted ${lead.name}` as const,
    refs: [...stage.pullDowns.slice(0, 1).map(({ part }) => part.ref), transistor.ref, lead.name],
  };
  const off = offVolts(stage, values);
  const leakage = leakageOf(stage);
  const volts = leakage.amps * ohms;
  if (!off) return missingFact(transistor, 'vth_min', 'V_GS(th) minimum', base);
  const stopAt = isFet(transistor) ? off.volts * values.stopShare : off.volts;
  const cautionAt = isFet(transistor) ? off.volts * values.cautionShare : off.volts * (values.cautionShare / values.stopShare);
  const severity: Severity | null = volts > stopAt ? 'stop' : volts >= cautionAt * (1 - 1e-9) ? 'caution' : null;
  if (!off.certain && severity !== 'stop') return missingFact(transistor, 'vth_min', 'V_GS(th) minimum', base);
  const limit = severity === 'stop' ? stopAt : cautionAt;
  const evidence: readonly Evidence[] = [
    {
      // A caution starts at its limit, not above it.
      entity: `${transistor.ref}:${terminals.controlPin}`, quantity: 'leakage voltage', value: severity === 'caution' ? Math.max(volts, cautionAt * (1 + 1e-9)) : volts, unit: 'V',
      source: `${say(leakage.amps, 'A')}${leakage.assumed ? ' (assumed)' : ''} × ${say(ohms, 'Ω')} with ${lead.name} lifted`,
      limit, limitSource: `${say(limit, 'V')}: from ${off.fact}`,
    },
    { entity: transistor.ref, quantity: isFet(transistor) ? 'igss' : 'icbo', value: leakage.amps, unit: 'A', source: leakage.assumed ? 'assumed' : 'typed' },
    { entity: `${transistor.ref}:${terminals.controlPin}`, quantity: 'resistance', value: ohms, unit: 'Ω', source: `connections with ${lead.name} lifted` },
    ...withstands(stage, ohms, off.volts),
  ];
  const confidence = leakage.assumed ? 'likely' : 'proven';
  if (!severity) return everywhere({ ...base, outcome: 'pass', confidence, message: `${lead.name} lifted: ${say(ohms, 'Ω')} keep ${transistor.ref} ${control} at its ${reference}`, evidence });
  return everywhere({
    ...base, outcome: 'fail', severity, confidence, evidence,
    message: `${lead.name} lifted: ${say(leakage.amps, 'A')} of leakage${leakage.assumed ? ' (assumed)' : ''} through ${say(ohms, 'Ω')} lifts ${transistor.ref} ${control} to ${say(volts, 'V')}; it is on from ${say(off.volts, 'V')}`,
    remedy: pullDownRemedy(circuit, stage, { leakage: leakage.amps, volts: cautionAt }),
  });
}

function stageOutcomes(circuit: Circuit, stage: Stage, values: Values): readonly Outcome[] {
  const drawn = circuit.leads.length === 0 ? Infinity : gateOhms(stage);
  if (!Number.isFinite(drawn)) return [];
  const near = new Set(stage.neighbourhood.map(({ part }) => part.id));
  const lifted = circuit.leads.map((lead) => ({ lead, ohms: lead.parts.some((part) => near.has(part.id)) ? ohmsWithout(circuit, stage, lead) : drawn }));
  const open = lifted.filter(({ ohms }) => !Number.isFinite(ohms));
  const off = offVolts(stage, values)?.volts ?? 1;
  if (open.length > 0) return [openOutcome(circuit, stage, open.map(({ lead }) => lead), off, isFet(stage.transistor) ? values.cautionShare : values.cautionShare / values.stopShare)];
  const worst = lifted.reduce((a, b) => (b.ohms > a.ohms ? b : a));
  return [resistiveOutcome(circuit, stage, worst, values)];
}

export const liftedLead: Rule<typeof parameters> = {
  id: 'lifted-lead', version: 1, title: 'Gate or base undefined with a lead off', severity: 'stop', needs: 'topology', parameters,
  check: ({ circuit, parameters: values }) => circuit.stages.flatMap((stage) => stageOutcomes(circuit, stage, values)),
};
