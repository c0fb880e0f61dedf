import { buildCircuit } from '@/lib/netlist/circuit/circuit';
import type { PointEngine } from '@/lib/netlist/engine-deck/engine-port';
import type { Finding } from '@/lib/netlist/findings/finding';
import type { Netlist } from '@/lib/netlist/netlist';
import type { PointSet } from '@/lib/netlist/points/point-set';
import { stationsOf } from '@/lib/netlist/points/station';
import { ruleRegistry } from '@/lib/netlist/rules/registry';
import { runRules, type ParameterValues } from '@/lib/netlist/rules/run-rules';
import { cachingEngine, PointCache } from './caching-engine';
import { runPoints } from './run-points';

export interface CheckOptions {
  readonly engine: PointEngine;
  /** Name of one hold point; without it and without a scenario, the whole plan. */
  readonly holdPoint?: string;
  /** Name of one scenario, examined by itself. */
  readonly scenario?: string;
  /** Rule parameters that differ from the rules' own, by rule id. */
  readonly parameters?: ParameterValues;
  /** Kept by the caller between checks of one circuit, so that points an edit leaves alone are not run again. */
  readonly cache?: PointCache;
}

export interface CheckResult {
  /** Of all outcomes; one for each fingerprint. */
  readonly findings: readonly Finding[];
  readonly points: PointSet;
}

/** The one check of a netlist, for browser, server and files: every rule, with the operating points they need. */
export async function checkNetlist(netlist: Netlist, { engine, holdPoint, scenario, parameters, cache = new PointCache() }: CheckOptions): Promise<CheckResult> {
  const circuit = buildCircuit(netlist);
  const stations = stationsOf(circuit, { ...(holdPoint === undefined ? {} : { holdPoint }), ...(scenario === undefined ? {} : { scenario }) });
  const points = await runPoints(circuit, cachingEngine(engine, cache), stations);
  return { findings: runRules(ruleRegistry, circuit, { points, ...(parameters ? { parameters } : {}) }), points };
}
