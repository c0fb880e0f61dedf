import type { PointEngine } from '@/lib/netlist/engine-deck/engine-port';
import type { Finding, OutcomeKind } from '@/lib/netlist/findings/finding';
import { buildCircuit } from '@/lib/netlist/circuit/circuit';
import { noPoints } from '@/lib/netlist/points/point-set';
import { stationsOf } from '@/lib/netlist/points/station';
import type { Netlist } from '@/lib/netlist/netlist';
import type { Rule } from '@/lib/netlist/rules/rule';
import { runRules } from '@/lib/netlist/rules/run-rules';
import { runPoints } from '../run-points';

const rank: Readonly<Record<OutcomeKind, number>> = { error: 4, fail: 3, undetermined: 2, pass: 1, 'not applicable': 0 };
const severityRank = { stop: 2, caution: 1, advice: 0 } as const;

/** Findings of one rule alone on a netlist, worst first. */
export async function findingsOf(rule: Rule, netlist: Netlist, engine: PointEngine, parameters: Readonly<Record<string, number>> = {}): Promise<readonly Finding[]> {
  const circuit = buildCircuit(netlist);
  const points = rule.needs === 'points' ? await runPoints(circuit, engine, stationsOf(circuit)) : noPoints;
  return [...runRules([rule], circuit, { points, parameters: { [rule.id]: parameters } })]
    .sort((a, b) => rank[b.outcome] - rank[a.outcome] || severityRank[b.severity] - severityRank[a.severity]);
}
