import type { NetlistPart } from '../netlist';
import { levelsOf } from './control-levels';
import type { Graph } from './graph';
import { labelOf, quantityOf } from './part-facts';
import { isTransistor, isUpperPolarity, isVoltageSource } from './part-nature';
import { roleOf } from './source-role';
import { endNets, terminalsOf } from './terminals';
import { walk } from './walk';

/** What turns stages on and off. */
export interface Control {
  readonly part: NetlistPart;
  readonly nature: 'pin' | 'generator' | 'source';
  /** Net of its plus pin. */
  readonly out: string;
  readonly back: string;
  readonly high: number;
  readonly low: number;
  readonly levelsFrom: string;
  /** Pulls low or lets go: `high` is high impedance. */
  readonly openDrain: boolean;
  /** Switching frequency in Hz, when it is driven at one. */
  readonly fsw: number | undefined;
}

export interface Sources {
  /** The source that the plan raises; null when none or several could be meant. */
  readonly power: NetlistPart | null;
  readonly controls: readonly Control[];
  /** Every voltage source that is no control. */
  readonly supplies: readonly NetlistPart[];
}

/** Nets reached from a gate or base through series parts; rails are reached and not walked beyond. */
function controlReach(graph: Graph, rails: ReadonlySet<string>, net: string): ReadonlySet<string> {
  if (rails.has(net)) return new Set([net]);
  const steps = walk(graph, net, {
    through: ({ nature }) => nature === 'resistor' || nature === 'joint' || nature === 'open' || nature === 'coil',
    stopAt: (reached) => rails.has(reached),
  });
  return new Set(steps.keys());
}

/** Whether a source feeds the current-carrying side of a transistor. */
function feedsLoad(graph: Graph, rails: ReadonlySet<string>, gates: ReadonlySet<string>, upper: ReadonlySet<string>, source: NetlistPart): boolean {
  return (endNets(source) ?? []).some((start) => {
    if (start === '0') return false;
    const steps = walk(graph, start, {
      through: ({ nature }) => nature === 'resistor' || nature === 'joint' || nature === 'open' || nature === 'coil' || nature === 'junction',
      stopAt: (net) => rails.has(net) || gates.has(net),
    });
    return [...steps.keys()].some((net) => upper.has(net) && !gates.has(net));
  });
}

/** Below this a wave counts as switching by hand: currents settle within its period. Common practice, no source. */
const fastFrom = 1_000;

/** Frequency of a wave that drives faster than currents settle; undefined for slower ones and for single shots. */
function waveFrequency({ wave }: NetlistPart): number | undefined {
  const period = wave?.shape === 'pulse' ? wave.args[6] : undefined;
  const hertz = wave?.shape === 'sin' ? wave.args[2] : period ? 1 / period : undefined;
  return hertz !== undefined && hertz >= fastFrom ? hertz : undefined;
}

function controlOf(part: NetlistPart): Control {
  const role = roleOf(part);
  const [out, back] = endNets(part) ?? ['', ''];
  const levels = levelsOf(part);
  return {
    part, out, back, high: levels.high, low: levels.low, levelsFrom: levels.source,
    nature: role === 'pin' ? 'pin' : role === 'generator' ? 'generator' : 'source',
    openDrain: labelOf(part, 'kind') === 'open-drain-gpio',
    fsw: quantityOf(part, 'fsw') ?? waveFrequency(part),
  };
}

function choosePower(sources: readonly NetlistPart[], feeds: (part: NetlistPart) => boolean): NetlistPart | null {
  const marked = sources.filter((part) => roleOf(part) === 'supply' || roleOf(part) === 'mains');
  if (marked.length > 0) return marked.length === 1 ? marked[0]! : null;
  const open = sources.filter((part) => roleOf(part) === undefined || roleOf(part) === 'battery');
  if (open.length === 1) return open[0]!;
  const feeding = open.filter(feeds);
  return feeding.length === 1 ? feeding[0]! : null;
}

/** Which source is the power source, which are controls and which are other supplies. */
export function findSources(graph: Graph, parts: readonly NetlistPart[], rails: ReadonlySet<string>): Sources {
  const sources = parts.filter(isVoltageSource);
  const transistors = parts.filter(isTransistor);
  const gates = new Set(transistors.map((part) => terminalsOf(part).control));
  const upper = new Set(transistors.map((part) => (isUpperPolarity(part) ? terminalsOf(part).reference : terminalsOf(part).output)));
  const feeds = (part: NetlistPart) => feedsLoad(graph, rails, gates, upper, part);
  const power = choosePower(sources, feeds);
  const marked = sources.filter((part) => roleOf(part) === 'pin' || roleOf(part) === 'generator');
  const reached = new Set(marked.length > 0 ? [] : [...gates].flatMap((net) => [...controlReach(graph, rails, net)]));
  const inferred = sources.filter((part) => part !== power && roleOf(part) === undefined
    && (endNets(part) ?? []).some((net) => net !== '0' && reached.has(net)) && !feeds(part));
  const controls = (marked.length > 0 ? marked : inferred).map(controlOf);
  return { power, controls, supplies: sources.filter((part) => !controls.some((control) => control.part === part)) };
}
