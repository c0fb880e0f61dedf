import type { Circuit } from './circuit';
import { isTransistor } from './part-nature';
import { resistanceBetween } from './resistance';
import type { Stage } from './stages';
import { terminalsOf } from './terminals';
import { walk } from './walk';

/** DC ohms from a stage's gate or base to its source or emitter with some parts taken out; Infinity without a path. */
export const gateOhms = (stage: Stage, gone: ReadonlySet<string> = new Set()): number =>
  resistanceBetween(stage.neighbourhood, stage.terminals.control, stage.terminals.reference, gone);

/** What could drive a gate that has no DC path of its own. */
export type Driver = 'pin' | 'transistors' | 'one transistor' | 'not examined' | 'junction' | 'nothing';

/** Tells what is joined to a gate through resistors, coils, joints and sources. */
export function driverOf(circuit: Circuit, stage: Stage): Driver {
  const steps = walk(circuit.graph, stage.terminals.control, {
    through: ({ nature }) => nature === 'resistor' || nature === 'coil' || nature === 'joint' || nature === 'source',
  });
  const nets = [...steps.keys()];
  const pins = nets.flatMap((net) => circuit.graph.pinsOn(net));
  if (pins.some(({ part }) => part.kind === 'box')) return 'not examined';
  if (circuit.controllerPins.some((pin) => steps.has(pin.net))) return 'pin';
  const others = new Set(pins.filter(({ part, pin }) => isTransistor(part) && part !== stage.transistor && pin !== terminalsOf(part).controlPin).map(({ part }) => part.id));
  if (others.size >= 2) return 'transistors';
  if (others.size === 1) return 'one transistor';
  return pins.some(({ part }) => part.kind === 'diode' || part.kind === 'schottky' || part.kind === 'zener' || part.kind === 'led') ? 'junction' : 'nothing';
}

