import type { Database } from '@/db/client';
import type { CircuitAccess } from '@/lib/access/gates';
import { Problem } from '@/lib/errors/problem';
import type { Finding } from '@/lib/netlist/findings/finding';
import type { Netlist } from '@/lib/netlist/netlist';
import { checkCopy, type PlanScope } from '@/lib/review/check-copy';
import { withinPatience } from '@/lib/review/check-on-server';
import type { CheckScope } from '@/lib/schemas/circuit';
import { keepCounts } from './keep-counts';
import { liveNetlist } from './live-netlist';

/** What a `scenario=` names: a hold point, which wins, or a scenario; 404 for neither. */
export function planScope({ holdPoints, scenarios }: Netlist, name: string | undefined): PlanScope {
  if (name === undefined) return {};
  if (holdPoints.some((point) => point.name === name)) return { holdPoint: name };
  if (scenarios.some((scenario) => scenario.name === name)) return { scenario: name };
  throw new Problem('not-found', `“${name}” is neither a hold point nor a scenario of this circuit.`);
}

/** Checks the committed sheet now: what fails, or every outcome when asked. A check of the whole plan also renews the counts in lists. */
export async function checkLive(db: Database, access: CircuitAccess, query: CheckScope): Promise<readonly Finding[]> {
  const { netlist, seq, contentHash } = await liveNetlist(db, access);
  const scope = planScope(netlist, query.scenario);
  const { findings } = await withinPatience(checkCopy(netlist, scope));
  if (query.scenario === undefined) await keepCounts(db, access.circuit, { seq, contentHash, findings });
  return query.outcomes === 'all' ? findings : findings.filter(({ outcome }) => outcome === 'fail');
}
