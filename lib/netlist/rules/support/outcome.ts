import type { NetlistPart } from '../../netlist';
import type { RunPoint } from '../../points/point-set';
import type { Station } from '../../points/station';
import type { Outcome } from '../rule';

type Given = Pick<Outcome, 'outcome' | 'severity' | 'target' | 'refs' | 'message' | 'evidence'> & Partial<Outcome>;

const drawn = { confidence: 'proven', nets: [], holdPoint: null, scenario: null, state: 'as drawn', corner: 'typ' } as const;

/** An outcome that holds at every hold point. */
export const everywhere = (given: Given): Outcome => ({ ...drawn, ...given });

/** An outcome of one station of the plan. */
export const atStation = (station: Station, given: Given): Outcome =>
  ({ ...drawn, holdPoint: station.holdPoint, scenario: station.scenario, ...given });

/** An outcome decided by one operating point. */
export const atPoint = (point: RunPoint, given: Given): Outcome =>
  ({ ...drawn, holdPoint: point.key.holdPoint, scenario: point.key.scenario, state: point.key.state, corner: point.key.corner, ...given });

/** `undetermined` for want of one fact: "cannot decide without Q1's V_GS maximum". */
export function missingFact(part: NetlistPart, fact: string, words: string, given: Pick<Outcome, 'severity' | 'target' | 'refs'> & Partial<Outcome>): Outcome {
  return everywhere({
    outcome: 'undetermined', confidence: 'proven', evidence: [], missing: `${part.ref} ${fact}`,
    message: `Cannot decide without ${part.ref}’s ${words} (${fact})`, ...given,
  });
}
