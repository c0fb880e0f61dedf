import { engineNumber } from '../models/model-line';
import type { NetlistPart } from '../netlist';
import { closedOhms } from './element-line';
import type { EngineContext, EngineElements, KindEngine } from './kind-engine';

/** One resistor between two pins; ngspice refuses 0 ohm, so a link of 0 ohm is a closed contact. */
export function resistorElement(
  { name, node }: EngineContext, [from, to]: readonly [string, string], ohms: number,
): EngineElements {
  return {
    lines: [`R${name} ${node(from)} ${node(to)} ${engineNumber(Math.max(ohms, closedOhms))}`],
    currents: { [from]: [{ vector: `i(@r${name}[i])`, sign: 1 }] },
    assumed: [],
  };
}

/** Engine half of a contact: a small resistance when closed, nothing when open. */
export function contactEngine(isClosed: (part: NetlistPart) => boolean): KindEngine {
  const pins = ['1', '2'] as const;
  return {
    controlPins: [],
    edges: (part) => [{ from: '1', to: '2', stiffness: isClosed(part) ? 'solid' : 'none' }],
    elements(part, context) {
      if (!isClosed(part)) return { lines: [], currents: { '1': [] }, assumed: [] };
      const ohms = part.facts.rs;
      return resistorElement(context, pins, typeof ohms === 'number' ? ohms : closedOhms);
    },
  };
}

/** Engine half of a capacitor: open at DC. */
export function capacitorEngine(pins: readonly [string, string]): KindEngine {
  return {
    controlPins: [],
    edges: () => [{ from: pins[0], to: pins[1], stiffness: 'none' }],
    elements: () => ({ lines: [], currents: { [pins[0]]: [] }, assumed: [] }),
  };
}

/** Engine half of a mark: no element, no edge. */
export const markEngine: KindEngine = {
  controlPins: [],
  edges: () => [],
  elements: () => ({ lines: [], currents: {}, assumed: [] }),
};
