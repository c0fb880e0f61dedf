import type { RevisionId } from '@/db/authorized';
import type { Database } from '@/db/client';
import { holdPointsOf, revisionFindings, revisionNetlist } from '@/db/queries/revisions';
import { Problem } from '@/lib/errors/problem';
import type { Finding } from '@/lib/netlist/findings/finding';
import type { CheckScope } from '@/lib/schemas/circuit';

/**
 * What the checks said at the cut. Lists give what fails unless all outcomes are asked for. A hold point's name (which wins) gives
 * what holds there: what fails from that voltage or a lower one on; a scenario's name gives what belongs to it. Neither: 404.
 */
export async function storedFindings(db: Database, revision: RevisionId, scope: CheckScope): Promise<Finding[]> {
  const all = await revisionFindings(db, revision);
  const wanted = scope.outcomes === 'all' ? all : all.filter(({ outcome }) => outcome === 'fail');
  if (scope.scenario === undefined) return wanted;
  const point = (await holdPointsOf(db, [revision])).find(({ name }) => name === scope.scenario);
  if (point) return wanted.filter(({ fromVolts }) => fromVolts === null || fromVolts <= point.volts);
  const netlist = await revisionNetlist(db, revision);
  if (!netlist?.scenarios.some(({ name }) => name === scope.scenario)) throw new Problem('not-found', `“${scope.scenario}” is neither a hold point nor a scenario.`);
  return wanted.filter(({ scenario }) => scenario === null || scenario === scope.scenario);
}
