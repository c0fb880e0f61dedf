import { PointCache } from '@/lib/check/caching-engine';
import { checkNetlist } from '@/lib/check/check-netlist';
import { voltsByHoldPoint } from '@/lib/check/net-volts';
import { Problem } from '@/lib/errors/problem';
import { ruleRegistry } from '@/lib/netlist/rules/registry';
import type { Netlist } from '@/lib/netlist/netlist';
import type { CheckedCopy, PlanScope } from './check-copy';
import { checkEngine } from './check-engine';

/** How long a request waits for its checks, the queue included. */
export const checkPatience = 10_000;

const shared = globalThis as typeof globalThis & { holdoffPoints?: PointCache };
const pointCache = (shared.holdoffPoints ??= new PointCache());

/** Waits for `work` at most `patience` ms, then answers 503 with `Retry-After`; the work itself ends and is kept for the next try. */
export async function withinPatience<T>(work: Promise<T>, patience = checkPatience): Promise<T> {
  let timer: NodeJS.Timeout | undefined;
  const late = new Promise<never>((_, reject) => {
    timer = setTimeout(() => reject(new Problem('busy', 'The check took too long.', { retryAfter: 5 })), patience);
  });
  try {
    return await Promise.race([work, late]);
  } finally {
    clearTimeout(timer);
  }
}

/** The product's one check, on the server's engine. */
export async function checkOnServer(netlist: Netlist, scope: PlanScope = {}): Promise<CheckedCopy> {
  const { findings, points } = await checkNetlist(netlist, { engine: checkEngine(), cache: pointCache, ...scope });
  const sources = new Map(points.stations.map(({ holdPoint, power }) => [holdPoint, power !== null]));
  return {
    findings,
    volts: voltsByHoldPoint(points),
    rules: Object.fromEntries(ruleRegistry.map(({ id, version, parameters }) => [
      id, { version, parameters: Object.fromEntries(Object.entries(parameters).map(([name, { value }]) => [name, value])) },
    ])),
    sourceKnown: (holdPoint) => sources.get(holdPoint) ?? false,
  };
}
