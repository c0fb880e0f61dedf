import { kindOf } from '../kinds/kind-registry';
import { magnitude } from '../models/fact-number';
import { engineNumber } from '../models/model-line';
import { thresholdAt } from '../models/mosfet-threshold';
import type { ModelCard, NetlistPart } from '../netlist';
import type { OperatingPoint } from '../points/point';
import type { ControlPin } from '../precheck/precheck';
import type { EngineNames } from './engine-names';

/** I_GSS or I_CBO that nobody gave, amps: ten times what data sheets print (docs/rules.md D, `lifted-lead`). */
const assumedLeakage = 1e-6;
/** Below this V_BE a bipolar transistor counts as off, volts (docs/engine.md 3.6). */
const bipolarOff = 0.4;
/** A gate that leakage moves by more than this part of its threshold is driven by nothing (docs/engine.md 3.6). */
const driftShare = 0.1;

/** The source that stands for a transistor's control leakage, into the control pin (1) or out of it (-1). */
export function leakageLine(part: NetlistPart, name: string, sign: 1 | -1, names: EngineNames): readonly string[] {
  return kindOf(part.kind).engine.controlPins.map((pin) => {
    const amps = magnitude(part.facts, isBipolar(part) ? 'icbo' : 'igss') ?? assumedLeakage;
    return `I${name}g 0 ${names.node(part.pins[pin] ?? '0')} ${engineNumber(sign * amps)}`;
  });
}

/** An operating point without leakage and with it both ways; null where the run with leakage was refused. */
export interface LeakageRuns {
  readonly plain: OperatingPoint;
  readonly into: OperatingPoint | null;
  readonly outOf: OperatingPoint | null;
}

/** Whether leakage alone decides what a transistor does: it moves a gate, or turns a bipolar transistor on that is off. */
export function isUndriven({ part, net }: ControlPin, { plain, into, outOf }: LeakageRuns, card: ModelCard | undefined): boolean {
  if (isBipolar(part)) {
    const leaky = part.kind === 'npn' ? into : outOf;
    return forwardVolts(part, plain) < bipolarOff && (leaky === null || forwardVolts(part, leaky) >= bipolarOff);
  }
  if (into === null || outOf === null) return true;
  return Math.abs((into.volts[net] ?? 0) - (outOf.volts[net] ?? 0)) > allowedDrift(part, card);
}

function allowedDrift(part: NetlistPart, card: ModelCard | undefined): number {
  const threshold = thresholdAt(part.facts, 'min');
  if (!('missing' in threshold)) return driftShare * threshold.volts;
  return driftShare * Math.abs(card?.params.vto ?? card?.params.vth0 ?? 0);
}

/** V_BE in the direction that turns the transistor on. */
function forwardVolts(part: NetlistPart, point: OperatingPoint): number {
  const volts = (pin: string): number => point.volts[part.pins[pin] ?? '0'] ?? 0;
  return (volts('B') - volts('E')) * (part.kind === 'npn' ? 1 : -1);
}

function isBipolar(part: NetlistPart): boolean {
  return part.kind === 'npn' || part.kind === 'pnp';
}
