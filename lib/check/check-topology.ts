import { buildCircuit } from '@/lib/netlist/circuit/circuit';
import type { Finding } from '@/lib/netlist/findings/finding';
import type { Netlist } from '@/lib/netlist/netlist';
import { ruleRegistry } from '@/lib/netlist/rules/registry';
import { runRules, type ParameterValues } from '@/lib/netlist/rules/run-rules';

const topologyRules = ruleRegistry.filter((rule) => rule.needs === 'topology');

/** What connections and facts alone decide, at once and without an engine. Findings of all outcomes. */
export function checkTopology(netlist: Netlist, parameters?: ParameterValues): readonly Finding[] {
  return runRules(topologyRules, buildCircuit(netlist), parameters ? { parameters } : {});
}
