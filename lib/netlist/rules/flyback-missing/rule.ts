import type { Circuit } from '../../circuit/circuit';
import { clampsOf, reversedDiodes } from '../../circuit/clamps';
import { switchedCoils, type SwitchedCoil } from '../../circuit/coils';
import { magnitudeOf, originOf } from '../../circuit/part-facts';
import { isCoil, isFet } from '../../circuit/part-nature';
import { highestRail } from '../../circuit/rail-range';
import type { Evidence, Remedy } from '../../findings/finding';
import type { NetlistPart } from '../../netlist';
import type { Outcome, Rule } from '../rule';
import { everywhere } from '../support/outcome';
import { say } from '../support/words';

const parameters = {
  energyShare: { value: 0.25, unit: '', words: 'share of E_AS that one turn-off may put into the switch', source: 'common practice, no source' },
  heating: { value: 10, unit: 'K', words: 'rise that the energy of every turn-off together may make', source: 'common practice, no source' },
  fastFrom: { value: 5_000, unit: 'Hz', words: 'switching frequency from which a fast diode is proposed', source: 'common practice, no source' },
} as const;

type Values = { readonly [K in keyof typeof parameters]: number };

/** Amps in a coil when its switch opens: its own fact, else the rail over what lies in series. Infinity where nothing is known. */
function coilAmps(circuit: Circuit, { coil, seriesOhms, stage }: SwitchedCoil): number {
  const own = magnitudeOf(coil, 'coil_i');
  if (own !== undefined) return own;
  const ohms = seriesOhms + (magnitudeOf(stage.transistor, 'rds_on') ?? 0);
  return ohms > 0 ? highestRail(circuit) / ohms : Infinity;
}

interface Avalanche {
  readonly joules: number;
  readonly limit: number;
  readonly source: string;
}

/** The switch takes the coil's energy itself, where its sheet allows it. */
function avalanche(circuit: Circuit, switched: SwitchedCoil, values: Values): Avalanche | null {
  const { coil, stage } = switched;
  const rated = magnitudeOf(stage.transistor, 'e_as');
  const henries = isCoil(coil) ? magnitudeOf(coil, 'value') : undefined;
  if (!isFet(stage.transistor) || rated === undefined || henries === undefined) return null;
  const joules = 0.5 * henries * coilAmps(circuit, switched) ** 2;
  if (!Number.isFinite(joules)) return null;
  const hertz = stage.control?.fsw ?? 0;
  const thermal = magnitudeOf(stage.transistor, 'rth_ja');
  const byHeat = hertz > 0 && thermal !== undefined && thermal > 0 ? values.heating / (hertz * thermal) : Infinity;
  const byRating = rated * values.energyShare;
  return byHeat < byRating
    ? { joules, limit: byHeat, source: `${values.heating} K at ${say(hertz, 'Hz')} and rth_ja of ${stage.transistor.ref}` }
    : { joules, limit: byRating, source: `${values.energyShare * 100} % of E_AS of ${stage.transistor.ref}, ${originOf(stage.transistor, 'e_as')}` };
}

const reverseRatings = [50, 100, 200, 400, 600, 1000, 1200];
const currentRatings = [1, 3, 5, 10, 15, 30];

function remedyOf(circuit: Circuit, switched: SwitchedCoil, values: Values): Remedy {
  const { ends: [near, far], side, stage } = switched;
  const fast = (stage.control?.fsw ?? 0) > values.fastFrom;
  const amps = coilAmps(circuit, switched);
  const vrMax = reverseRatings.find((volts) => volts * 0.75 >= highestRail(circuit) * 1.1 + 1);
  const ifMax = Number.isFinite(amps) ? currentRatings.find((rating) => rating >= amps) : 1;
  const words = `Put a ${fast ? 'fast or Schottky' : ''} diode across ${switched.coil.ref}, stripe to the plus side`.replace('a  ', 'a ');
  if (vrMax === undefined || ifMax === undefined) return { words: `${words}.` };
  const schottky = fast && vrMax <= 100;
  return {
    words: `${words}: ${say(vrMax, 'V')}, ${say(ifMax, 'A')} or more${!fast && vrMax <= 1000 && ifMax === 1 ? ' (1N4007)' : ''}.`,
    edits: [{
      edit: 'add part', kind: schottky ? 'schottky' : 'diode', facts: { vr_max: vrMax, if_max: ifMax, ...(fast && !schottky ? { trr: 75e-9 } : {}) },
      pins: side === 'low' ? { A: near, K: far } : { A: far, K: near },
    }],
  };
}

function coilOutcome(circuit: Circuit, coil: NetlistPart, all: readonly SwitchedCoil[], values: Values): Outcome {
  const refs = [coil.ref, ...new Set(all.map(({ stage }) => stage.transistor.ref))];
  const base = { severity: 'stop', target: { coil: [coil.id] }, refs } as const;
  const clampEvidence = (value: number): Evidence => ({ entity: coil.ref, quantity: 'clamps', value, unit: '', source: 'connections', limit: 1, limitSource: 'V = L·di/dt: the current needs a way on when the switch opens' });
  const bare = all.filter((switched) => clampsOf(circuit, switched).length === 0);
  const reversed = all.some((switched) => reversedDiodes(circuit, switched).length > 0);
  if (reversed) return everywhere({ ...base, outcome: 'not applicable', message: `${coil.ref}: flyback-reversed speaks of its diode`, evidence: [] });
  const worst = bare[0];
  if (!worst) return everywhere({ ...base, outcome: 'pass', message: `${coil.ref}: its current has a way on when the switch opens`, evidence: [clampEvidence(1)] });
  const energy = avalanche(circuit, worst, values);
  const transistor = worst.stage.transistor;
  const energyEvidence: readonly Evidence[] = energy ? [{
    entity: coil.ref, quantity: 'energy', value: energy.joules, unit: 'J', source: `½·L·I² at ${say(coilAmps(circuit, worst), 'A')}`,
    limit: energy.limit, limitSource: energy.source,
  }] : [];
  if (energy && energy.joules < energy.limit) return everywhere({ ...base, outcome: 'pass', message: `${coil.ref} stores ${say(energy.joules, 'J')}: ${transistor.ref} takes that itself`, evidence: energyEvidence });
  return everywhere({
    ...base, outcome: 'fail', refs: [coil.ref, transistor.ref], nets: [worst.ends[0]],
    message: `${coil.ref} has no way on for its current when ${transistor.ref} opens: it breaks ${transistor.ref} down`,
    evidence: [clampEvidence(0), ...energyEvidence],
    remedy: remedyOf(circuit, worst, values),
  });
}

export const flybackMissing: Rule<typeof parameters> = {
  id: 'flyback-missing', version: 1, title: 'No flyback path across a coil', severity: 'stop', needs: 'topology', parameters,
  check: ({ circuit, parameters: values }) => {
    const byCoil = new Map<NetlistPart, SwitchedCoil[]>();
    for (const switched of circuit.stages.flatMap((stage) => switchedCoils(circuit, stage))) byCoil.set(switched.coil, [...(byCoil.get(switched.coil) ?? []), switched]);
    return [...byCoil].map(([coil, all]) => coilOutcome(circuit, coil, all, values));
  },
};
