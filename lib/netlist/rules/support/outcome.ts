import type { NetlistPart } from '../../netlist';
import type { RunPoint } from '../../points/point-set';
import type { Station } from '../../points/station';
import type { Outcome } from '../rule';

type Given = Pick<Outcome, 'outcome' | 'severity' | 'target' | 'refs' | 'message' | 'evidence'> & Partial<Outcome>;

type Place = Pick<Outcome, 'holdPoint' | 'scenario' | 'state' | 'corner'>;

const drawn: Place = { holdPoint: null, scenario: null, state: 'as drawn', corner: 'typ' };

/** Field by field: a sheet of 300 parts has thousands of outcomes, and spreading objects of many shapes took a third of their time. */
const placed = (place: Place, given: Given): Outcome => ({
  outcome: given.outcome,
  severity: given.severity,
  confidence: given.confidence ?? 'proven',
  target: given.target,
  refs: given.refs,
  nets: given.nets ?? [],
  holdPoint: given.holdPoint === undefined ? place.holdPoint : given.holdPoint,
  scenario: given.scenario === undefined ? place.scenario : given.scenario,
  state: given.state ?? place.state,
  corner: given.corner ?? place.corner,
  message: given.message,
  evidence: given.evidence,
  ...(given.missing === undefined ? null : { missing: given.missing }),
  ...(given.remedy === undefined ? null : { remedy: given.remedy }),
});

/** An outcome that holds at every hold point. */
export const everywhere = (given: Given): Outcome => placed(drawn, given);

/** An outcome of one station of the plan. */
export const atStation = ({ holdPoint, scenario }: Station, given: Given): Outcome =>
  placed({ holdPoint, scenario, state: 'as drawn', corner: 'typ' }, given);

/** An outcome decided by one operating point. */
export const atPoint = ({ key }: RunPoint, given: Given): Outcome => placed(key, given);

/** `undetermined` for want of one fact: "cannot decide without Q1's V_GS maximum". */
export function missingFact(part: NetlistPart, fact: string, words: string, given: Pick<Outcome, 'severity' | 'target' | 'refs'> & Partial<Outcome>): Outcome {
  return everywhere({
    outcome: 'undetermined', confidence: 'proven', evidence: [], missing: `${part.ref} ${fact}`,
    message: `Cannot decide without ${part.ref}’s ${words} (${fact})`, ...given,
  });
}
