import type { Net, Netlist, NetlistPart } from '../netlist';
import { withCardFacts } from './card-facts';
import { findControllerPins, type ControllerPin } from './controller-pins';
import { buildGraph, type Graph } from './graph';
import { findLeads, type LeadGroup } from './leads';
import { findLedBranches, type LedBranch } from './led-branches';
import { findMainsNets } from './mains-fed';
import { findRails, findStiffNets } from './rails';
import { findSmoothedNets } from './smoothed';
import { isAlternating } from './source-role';
import { findSources, type Sources } from './sources';
import { findStages, type Stage } from './stages';

/** A netlist with everything that more than one rule derives from it, worked out once. Immutable. */
export interface Circuit {
  readonly netlist: Netlist;
  readonly graph: Graph;
  /** Nets tied to 0 V by sources alone. */
  readonly rails: ReadonlySet<string>;
  /** Rails and what joints tie to them. */
  readonly stiff: ReadonlySet<string>;
  readonly sources: Sources;
  readonly stages: readonly Stage[];
  readonly leads: readonly LeadGroup[];
  readonly controllerPins: readonly ControllerPin[];
  /** Nets that a mains source feeds. */
  readonly mainsNets: ReadonlySet<string>;
  /** Nets that a capacitor holds up between the peaks of an alternating source; empty without one. */
  readonly smoothedNets: ReadonlySet<string>;
  readonly ledBranches: readonly LedBranch[];
  partById(id: string): NetlistPart | undefined;
  /** First part with this designator. */
  partByRef(ref: string): NetlistPart | undefined;
  net(name: string): Net | undefined;
}

export function buildCircuit(drawn: Netlist): Circuit {
  const netlist = withCardFacts(drawn);
  const graph = buildGraph(netlist.parts);
  const rails = findRails(graph);
  const sources = findSources(graph, netlist.parts, rails);
  const byId = new Map(netlist.parts.map((part) => [part.id, part]));
  const byRef = new Map([...netlist.parts].reverse().map((part) => [part.ref, part]));
  const nets = new Map(netlist.nets.map((net) => [net.name, net]));
  return {
    netlist, graph, rails, sources,
    stiff: findStiffNets(graph),
    stages: findStages(graph, netlist.parts, rails, sources),
    leads: findLeads(netlist.parts),
    controllerPins: findControllerPins(graph, netlist.parts),
    mainsNets: findMainsNets(graph, netlist.parts, rails),
    smoothedNets: sources.supplies.some(isAlternating) ? findSmoothedNets(graph, netlist.parts, rails) : new Set(),
    ledBranches: findLedBranches(graph, rails),
    partById: (id) => byId.get(id),
    partByRef: (ref) => byRef.get(ref),
    net: (name) => nets.get(name),
  };
}
