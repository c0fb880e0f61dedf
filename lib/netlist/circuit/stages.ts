import type { NetlistPart } from '../netlist';
import type { Edge, Graph } from './graph';
import { isInductive, isLoad, isOptical, isRemovable, isTransistor, ohmsOf } from './part-nature';
import type { Control, Sources } from './sources';
import { terminalsOf, type Terminals } from './terminals';
import { pathTo, walk, type Step } from './walk';

export interface PullDown {
  readonly part: NetlistPart;
  /** Net of the gate's side at which it joins. */
  readonly net: string;
  readonly pin: string;
  readonly ohms: number;
}

/** One transistor with what drives it and what it switches. */
export interface Stage {
  readonly transistor: NetlistPart;
  readonly terminals: Terminals;
  /** Nets reached from the gate or base through series parts, with the way there. */
  readonly reach: ReadonlyMap<string, Step>;
  /** Source or emitter net with what joints and a sense resistor (≤ 10 Ω) tie to it. */
  readonly references: ReadonlySet<string>;
  readonly control: Control | null;
  /** Edges from the gate to its control, gate first; empty without one. */
  readonly way: readonly Edge[];
  /** Resistors from a net of the gate's side to the source or emitter (pull-ups of P-channel parts included). */
  readonly pullDowns: readonly PullDown[];
  /** Zeners from a net of the gate's side to the source or emitter. */
  readonly clamps: readonly NetlistPart[];
  /** Edges between drain or collector and the first rail. */
  readonly load: readonly Edge[];
  readonly inductive: boolean;
  /** Edges around gate and source, up to the supplies' rails: all that can decide the gate's DC path, whatever is lifted. */
  readonly neighbourhood: readonly Edge[];
}

const senseOhms = 10;

function referencesOf(graph: Graph, rails: ReadonlySet<string>, gates: ReadonlySet<string>, net: string): ReadonlySet<string> {
  return new Set(walk(graph, net, {
    through: (edge) => edge.nature === 'joint' || (!rails.has(net) && edge.nature === 'resistor' && !isLoad(edge.part) && ohmsOf(edge.part) <= senseOhms),
    stopAt: (reached) => rails.has(reached) || gates.has(reached),
  }).keys());
}

function joins(edge: Edge, reach: ReadonlyMap<string, Step>, references: ReadonlySet<string>): { net: string; pin: string } | null {
  if (reach.has(edge.a) && !references.has(edge.a) && references.has(edge.b)) return { net: edge.a, pin: edge.aPin };
  if (reach.has(edge.b) && !references.has(edge.b) && references.has(edge.a)) return { net: edge.b, pin: edge.bPin };
  return null;
}

function loadOf(graph: Graph, rails: ReadonlySet<string>, start: string): readonly Edge[] {
  if (rails.has(start)) return [];
  const through = ({ nature }: Edge) => nature === 'resistor' || nature === 'joint' || nature === 'open' || nature === 'coil' || nature === 'junction';
  const steps = walk(graph, start, { through, stopAt: (net) => rails.has(net) });
  // Every way between the nets reached, not the first one found: a coil beside its diode is the load.
  const inside = [...steps.keys()].filter((net) => !rails.has(net));
  const edges = inside.flatMap((net) => graph.edgesAt(net)).filter((edge) => through(edge) && steps.has(edge.a) && steps.has(edge.b));
  return [...new Set(edges)];
}

/** Nets that sources other than controls tie to 0 V: they stay rails when a control lets go. */
function supplyRails(graph: Graph, { controls }: Sources): ReadonlySet<string> {
  const driving = new Set(controls.map(({ part }) => part.id));
  return new Set(walk(graph, '0', { through: (edge) => edge.nature === 'source' && !driving.has(edge.part.id) }).keys());
}

function neighbourhoodOf(graph: Graph, fixed: ReadonlySet<string>, { control, reference }: Terminals): readonly Edge[] {
  const edges = new Set<Edge>();
  for (const start of [control, reference]) {
    if (fixed.has(start)) continue;
    const steps = walk(graph, start, {
      through: ({ nature }) => nature === 'resistor' || nature === 'joint' || nature === 'coil' || nature === 'source',
      stopAt: (net) => fixed.has(net),
    });
    for (const net of steps.keys()) if (!fixed.has(net)) for (const edge of graph.edgesAt(net)) edges.add(edge);
  }
  for (const edge of graph.edges) if (edge.nature === 'source') edges.add(edge);
  return [...edges];
}

function stageOf(graph: Graph, rails: ReadonlySet<string>, fixed: ReadonlySet<string>, gates: ReadonlySet<string>, sources: Sources, transistor: NetlistPart): Stage {
  const terminals = terminalsOf(transistor);
  const references = referencesOf(graph, rails, gates, terminals.reference);
  const tied = fixed.has(terminals.control) || references.has(terminals.control);
  const reach = walk(graph, terminals.control, {
    through: ({ nature }) => !tied && (nature === 'resistor' || nature === 'joint' || nature === 'open' || nature === 'coil'),
    stopAt: (net) => rails.has(net) || references.has(net),
  });
  const ways = sources.controls
    .map((control) => ({ control, at: [control.out, control.back].find((net) => net !== '0' && reach.has(net) && !references.has(net)) }))
    .filter((candidate): candidate is { control: Control; at: string } => candidate.at !== undefined)
    .map(({ control, at }) => ({ control, way: pathTo(reach, at) }))
    .sort((x, y) => x.way.length - y.way.length);
  const around = [...reach.keys()].flatMap((net) => graph.edgesAt(net));
  const near = [...new Set(around)];
  const load = loadOf(graph, rails, terminals.output);
  const lower = loadOf(graph, rails, terminals.reference);
  return {
    transistor, terminals, reach, references, load,
    neighbourhood: neighbourhoodOf(graph, fixed, terminals),
    control: ways[0]?.control ?? null,
    way: ways[0]?.way ?? [],
    pullDowns: near.flatMap((edge) => {
      const at = edge.nature === 'resistor' ? joins(edge, reach, references) : null;
      return at ? [{ part: edge.part, ...at, ohms: ohmsOf(edge.part) }] : [];
    }),
    clamps: near.filter((edge) => edge.part.kind === 'zener' && joins(edge, reach, references)).map((edge) => edge.part),
    inductive: [...load, ...lower].some((edge) => isInductive(edge.part)),
  };
}

/** Every transistor as a driver stage, in canonical part order. */
export function findStages(graph: Graph, parts: readonly NetlistPart[], rails: ReadonlySet<string>, sources: Sources): readonly Stage[] {
  const transistors = parts.filter((part) => isTransistor(part) && !isOptical(part));
  const gates = new Set(transistors.map((part) => terminalsOf(part).control));
  const fixed = supplyRails(graph, sources);
  return transistors.map((transistor) => stageOf(graph, rails, fixed, gates, sources, transistor));
}

/** Leads, plug contacts and switches on a stage's way from gate to control. */
export const breaksOn = (stage: Stage): readonly NetlistPart[] =>
  stage.way.map((edge) => edge.part).filter((part) => isRemovable(part) || part.kind === 'switch');

/** Resistors on a stage's way, gate first. */
export const seriesOn = (stage: Stage): readonly Edge[] => stage.way.filter((edge) => edge.nature === 'resistor');

/** Driven at a frequency into a coil: its static high state says nothing of currents and watts. */
export const isSwitchedCoil = (stage: Stage): boolean => stage.inductive && stage.control?.fsw !== undefined;
