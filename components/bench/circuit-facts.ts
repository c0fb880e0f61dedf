import { touchSafeVolts } from '@/components/ladder/ladder-point';
import { voltsWords } from '@/components/ladder/plan-words';
import type { Circuit } from '@/lib/schemas/circuit';

const stateWords: Readonly<Record<Circuit['state'], string>> = {
  draft: 'Draft',
  cut: 'Cut, not in review yet',
  'in review': 'In review',
  'changes asked': 'Changes asked',
  'signed off': 'Signed off',
  superseded: 'Superseded',
  withdrawn: 'Sign-off withdrawn',
};

/** State of a circuit in a few words; a sheet that moved on after its newest revision is a draft first. */
export function circuitStateWords(circuit: Circuit): string {
  const { newest, draft, reached } = circuit;
  if (!newest) return 'Draft, no revision yet';
  if (draft) return reached ? `Draft, after ${newest.letter}. Not covered by its sign-off` : `Draft, after ${newest.letter}`;
  if (circuit.state === 'signed off' && reached) return `Signed off to ${voltsWords(reached.volts)}`;
  return stateWords[circuit.state];
}

export function stateName(state: Circuit['state']): string {
  return stateWords[state];
}

/** Highest voltage of the plan, null without a plan. */
export function topVolts(circuit: Circuit): number | null {
  return circuit.holdPoints.at(-1)?.volts ?? null;
}

/** How far the newest drawing is signed, and how far only an earlier one is. */
export function signedFacts(circuit: Circuit): { readonly to: number | null; readonly past: number | null } {
  const { reached, newest, draft } = circuit;
  if (!reached) return { to: null, past: null };
  return reached.letter === newest?.letter && !draft ? { to: reached.volts, past: null } : { to: null, past: reached.volts };
}

export function waitsFor(circuit: Circuit, person: string): boolean {
  return circuit.waitingFor.some((waiting) => waiting.id === person);
}

export type CircuitView = 'all' | 'mine' | 'blocked' | 'hazardous';

/** What each view of the table shows. */
export const inView: Readonly<Record<CircuitView, (circuit: Circuit, person: string) => boolean>> = {
  all: () => true,
  mine: waitsFor,
  blocked: (circuit) => (circuit.openStops ?? 0) > 0,
  hazardous: (circuit) => (topVolts(circuit) ?? 0) > touchSafeVolts,
};

/** Matches title, makers and those who are waited for, letter case aside. */
export function matchesSearch(circuit: Circuit, search: string): boolean {
  const wanted = search.trim().toLocaleLowerCase();
  if (wanted === '') return true;
  return [circuit.title, ...circuit.makers.map((maker) => maker.name), ...circuit.waitingFor.map((person) => person.name)]
    .some((text) => text.toLocaleLowerCase().includes(wanted));
}

export type CircuitSort = 'changed' | 'title' | 'volts';

const order: Readonly<Record<CircuitSort, (a: Circuit, b: Circuit) => number>> = {
  changed: (a, b) => (a.changedAt < b.changedAt ? 1 : -1),
  title: (a, b) => a.title.localeCompare(b.title),
  volts: (a, b) => (topVolts(b) ?? 0) - (topVolts(a) ?? 0),
};

export function sortCircuits(circuits: readonly Circuit[], by: CircuitSort): readonly Circuit[] {
  return [...circuits].sort(order[by]);
}
