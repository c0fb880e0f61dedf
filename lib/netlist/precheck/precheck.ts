import { UnionFind } from '../connectivity/union-find';
import { groundEnd, type KindEdge } from '../kinds/kind-engine';
import { kindOf } from '../kinds/kind-registry';
import type { NetlistPart } from '../netlist';
import { sourceLoops } from './source-loops';

export type PrecheckCode =
  /** Nothing stands on the 0 V net. */
  | 'NO_GROUND'
  /** No part joins these nets to 0 V. */
  | 'ISLAND'
  /** Parts join this net to 0 V, none of them conducting at DC. */
  | 'NO_DC_PATH'
  /** A gate or base without any DC path: both states must be assumed. */
  | 'UNDRIVEN'
  /** A gate or base that reaches 0 V through junctions or channels only: a run with leakage decides. */
  | 'WEAK_DRIVE'
  /** Ideal sources, or one and coils without resistance, close a ring. */
  | 'V_OR_L_LOOP'
  | 'V_SHORTED'
  | 'LONE_PIN';

export interface PrecheckFinding {
  readonly code: PrecheckCode;
  readonly nets: readonly string[];
  /** Designators, the part that the finding is about first. */
  readonly parts: readonly string[];
  readonly words: string;
}

export interface ControlPin {
  readonly part: NetlistPart;
  readonly pin: string;
  readonly net: string;
}

export interface Precheck {
  readonly findings: readonly PrecheckFinding[];
  /** Nets with a DC path to 0 V: what a run can give volts for. */
  readonly liveNets: ReadonlySet<string>;
  readonly weakControls: readonly ControlPin[];
}

interface PlacedEdge extends KindEdge {
  readonly part: NetlistPart;
  readonly nets: readonly [string, string];
}

/**
 * What topology alone decides before a run (docs/engine.md 3.6): ngspice gives numbers for floating nets that mean
 * nothing. `parts` are those of the run, without lifted leads and what else it takes out.
 */
export function precheck(parts: readonly NetlistPart[]): Precheck {
  const edges = parts.flatMap(placedEdges);
  const [any, conducting, solid] = [new UnionFind(), new UnionFind(), new UnionFind()];
  for (const edge of edges) {
    any.join(...edge.nets);
    if (edge.stiffness !== 'none') conducting.join(...edge.nets);
    if (edge.stiffness === 'solid') solid.join(...edge.nets);
  }

  const pinCounts = new Map<string, number>();
  for (const part of parts) {
    for (const net of Object.values(part.pins)) pinCounts.set(net, (pinCounts.get(net) ?? 0) + 1);
  }
  const nets = [...pinCounts.keys()];
  const live = (net: string): boolean => conducting.find(net) === conducting.find('0');
  const controls = parts.flatMap(controlPins);
  const undriven = controls.filter((control) => !live(control.net) && otherNets(control).some(live));
  const weakControls = controls.filter(({ net }) => live(net) && solid.find(net) !== solid.find('0'));

  return {
    liveNets: new Set(nets.filter(live)),
    weakControls,
    findings: [
      ...(pinCounts.has('0') || parts.length === 0 ? [] : [noGround]),
      ...nets.filter((net) => !live(net)).map((net) => floating(net, any.find(net) !== any.find('0'), parts)),
      ...undriven.map((control) => controlFinding('UNDRIVEN', control, 'has no DC path')),
      ...weakControls.map((control) => controlFinding('WEAK_DRIVE', control, 'reaches 0 V through junctions or channels only')),
      ...sourceLoops(edges),
      ...nets.filter((net) => pinCounts.get(net) === 1).map((net) => lonePin(net, parts)),
    ],
  };
}

const noGround: PrecheckFinding = { code: 'NO_GROUND', nets: [], parts: [], words: 'Nothing stands on 0 V' };

function placedEdges(part: NetlistPart): readonly PlacedEdge[] {
  const netOf = (end: string): string => (end === groundEnd ? '0' : part.pins[end] ?? '');
  return kindOf(part.kind).engine.edges(part).map((edge) => ({ ...edge, part, nets: [netOf(edge.from), netOf(edge.to)] }));
}

function controlPins(part: NetlistPart): readonly ControlPin[] {
  return kindOf(part.kind).engine.controlPins.map((pin) => ({ part, pin, net: part.pins[pin] ?? '' }));
}

function otherNets({ part, pin }: ControlPin): readonly string[] {
  return Object.entries(part.pins).filter(([name]) => name !== pin).map(([, net]) => net);
}

function floating(net: string, island: boolean, parts: readonly NetlistPart[]): PrecheckFinding {
  return {
    code: island ? 'ISLAND' : 'NO_DC_PATH',
    nets: [net],
    parts: partsOn(net, parts),
    words: island ? `${net} is joined to 0 V by no part` : `${net} has no DC path to 0 V`,
  };
}

function controlFinding(code: 'UNDRIVEN' | 'WEAK_DRIVE', { part, pin, net }: ControlPin, words: string): PrecheckFinding {
  return { code, nets: [net], parts: [part.ref], words: `${part.ref}:${pin} ${words}` };
}

function lonePin(net: string, parts: readonly NetlistPart[]): PrecheckFinding {
  return { code: 'LONE_PIN', nets: [net], parts: partsOn(net, parts), words: `${net} has one pin` };
}

function partsOn(net: string, parts: readonly NetlistPart[]): readonly string[] {
  return parts.filter((part) => Object.values(part.pins).includes(net)).map((part) => part.ref);
}
