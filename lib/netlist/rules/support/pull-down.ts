import { netWords } from '../../connectivity/net-words';
import type { Circuit } from '../../circuit/circuit';
import type { Stage } from '../../circuit/stages';
import { acrossFrom, type Edge } from '../../circuit/graph';
import { ohmsOf, isRemovable } from '../../circuit/part-nature';
import { leadName } from '../../circuit/leads';
import { magnitudeOf } from '../../circuit/part-facts';
import type { Remedy } from '../../findings/finding';
import { decadeOf } from '../../series/preferred-values';
import { driverLimit, driverOhms } from './driver-limit';
import { listWords, say } from './words';

/** Edges of a stage's way that lie between a net of the gate's side and its control. */
export function frontOf(stage: Stage, net: string): readonly Edge[] {
  let at = stage.terminals.control;
  const index = at === net ? 0 : stage.way.findIndex((edge) => {
    at = acrossFrom(edge, at);
    return at === net;
  }) + 1;
  return index === 0 && net !== stage.terminals.control ? [] : stage.way.slice(index);
}

/** Ohms between a net of the gate's side and the inside of its control. */
export const frontOhms = (stage: Stage, net: string): number =>
  frontOf(stage, net).reduce((sum, edge) => sum + ohmsOf(edge.part), 0) + (stage.control ? driverOhms(stage.control) : 0);

export const tooStrongShare = 0.1;
export const driverShare = 0.25;

/** Whether a pull-down of so many ohms at a net would cost too much drive or take too much of the driver. */
export function isTooStrong(stage: Stage, net: string, ohms: number): boolean {
  const front = frontOhms(stage, net);
  if (front / (front + ohms) > tooStrongShare) return true;
  const limit = stage.control ? driverLimit(stage.control) : undefined;
  return limit !== undefined && stage.control !== null && Math.abs(stage.control.high) / (front + ohms) > driverShare * limit.value;
}

const wantedOhms = 22e3;

/** Net for a pull-down: past the gate resistor, but before the first lead, plug or switch on the way to the driver. */
export function pullDownNet(stage: Stage): string {
  let at = stage.terminals.control;
  for (const edge of stage.way) {
    if (edge.nature !== 'resistor' && edge.nature !== 'coil') break;
    const next = acrossFrom(edge, at);
    if (next === stage.control?.out || next === stage.control?.back) return edge.nature === 'resistor' ? next : at;
    at = next;
  }
  return at;
}

/** Leakage, and a pin's pull-up, that a pull-down has to hold down. */
export interface PullDownNeed {
  /** Amps of gate leakage. */
  readonly leakage: number;
  /** Volts that leakage may make at most. */
  readonly volts: number;
  /** Ohms below which the pull-down wins against a pin's pull-up; Infinity without one. */
  readonly below?: number;
}

/** E12 value nearest 22 kΩ that is neither too weak nor too strong here; undefined when there is none. */
export function chooseOhms(stage: Stage, net: string, { leakage, volts, below = Infinity }: PullDownNeed): number | undefined {
  return [3, 4, 5].flatMap((power) => decadeOf('E12').map((step) => Math.round(step * 100) * 10 ** (power - 2)))
    .sort((a, b) => Math.abs(Math.log(a / wantedOhms)) - Math.abs(Math.log(b / wantedOhms)))
    .find((ohms) => ohms < below && ohms * leakage < volts && !isTooStrong(stage, net, ohms));
}

/** Proposed pull-down of a stage; words where no ordinary value fits. */
export function pullDownRemedy({ netlist }: Circuit, stage: Stage, need: PullDownNeed): Remedy {
  const net = pullDownNet(stage);
  const { reference } = stage.terminals;
  const ohms = chooseOhms(stage, net, need);
  const breaks = stage.way.map((edge) => edge.part).filter((part) => isRemovable(part) || part.kind === 'switch');
  const side = breaks.length > 0 ? `, on the ${stage.terminals.controlPin === 'B' ? 'base' : 'gate'}’s side of ${listWords([...new Set(breaks.map(leadName))])}` : '';
  if (ohms === undefined) return { words: `Keep ${stage.transistor.ref} off with a driver of its own: no single resistor is weak enough for this drive and strong enough for its leakage.` };
  return {
    words: `Add ${say(ohms, 'Ω')} from ${netWords(netlist, net)} to ${netWords(netlist, reference)}${side}: undefined then means off.`,
    edits: [{ edit: 'add part', kind: 'resistor', facts: { value: ohms, pmax: 0.25 }, pins: { 1: net, 2: reference } }],
  };
}

/** Leakage of a gate, 1 µA where the sheet is silent (ten times `sources.md` 6.3), or of a base (I_CBO, 1 µA assumed). */
export function leakageOf(stage: Stage): { readonly amps: number; readonly assumed: boolean } {
  const fet = stage.transistor.kind === 'nmos' || stage.transistor.kind === 'pmos';
  const own = magnitudeOf(stage.transistor, fet ? 'igss' : 'icbo');
  return own === undefined || own === 0 ? { amps: 1e-6, assumed: true } : { amps: own, assumed: false };
}
