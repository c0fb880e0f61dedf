import { magnitude } from '../models/fact-number';
import { engineNumber } from '../models/model-line';
import type { NetlistPart } from '../netlist';
import type { EngineContext, EngineElements, KindEngine, PartSetting } from './kind-engine';

/** Output resistance of a bench supply below its limit, ohms (docs/engine.md 3.5). */
const supplyOhms = 0.01;
/** Across the output of a limited source, so that it has a voltage without a load, ohms. */
export const bleedOhms = 1e6;

/** Current limit of a source in a run, amps: the hold point's or scenario's, else its own; undefined when it has none. */
export function limitOf(part: NetlistPart, setting: PartSetting): number | undefined {
  return setting.amps === undefined ? magnitude(part.facts, 'ilim') : setting.amps ?? undefined;
}

/**
 * Engine half of a source between two pins. Ideal without `rs` and limit; with `rs` a resistor in series; with a limit
 * `I = min(limit, (V_set − V)/R)`, one-sided: a clamp on both sides makes ngspice answer wrongly (docs/engine.md 1.4, 3.5).
 */
export function sourceEngine(
  pins: readonly [string, string],
  voltsOf: (part: NetlistPart, setting: PartSetting) => number | undefined,
  missing: string,
): KindEngine {
  const [plus, minus] = pins;
  return {
    controlPins: [],
    edges(part) {
      const soft = magnitude(part.facts, 'rs') !== undefined || limitOf(part, {}) !== undefined;
      return [{ from: plus, to: minus, stiffness: 'solid', ...(soft ? {} : { stiff: 'source' as const }) }];
    },
    elements(part, context) {
      const volts = voltsOf(part, context.setting);
      if (volts === undefined) return { missing };
      const limit = limitOf(part, context.setting);
      const ohms = magnitude(part.facts, 'rs');
      return limit === undefined
        ? plainSource(context, pins, volts, ohms)
        : limitedSource(context, pins, volts, limit, ohms ?? supplyOhms);
    },
  };
}

function plainSource(
  { name, node, innerNode }: EngineContext, [plus, minus]: readonly [string, string], volts: number, ohms: number | undefined,
): EngineElements {
  const inside = ohms === undefined ? node(plus) : innerNode('emf');
  return {
    lines: [
      `V${name} ${inside} ${node(minus)} ${engineNumber(volts)}`,
      ...(ohms === undefined ? [] : [`R${name} ${node(plus)} ${inside} ${engineNumber(ohms)}`]),
    ],
    currents: { [plus]: [{ vector: `i(v${name})`, sign: 1 }] },
    assumed: [],
  };
}

function limitedSource(
  { name, node, innerNode }: EngineContext, [plus, minus]: readonly [string, string], volts: number, limit: number, ohms: number,
): EngineElements {
  const inside = innerNode('out');
  const wanted = `(${engineNumber(volts)}-V(${inside},${node(minus)}))/${engineNumber(ohms)}`;
  const bounded = volts < 0 ? `max(${engineNumber(-limit)}, ${wanted})` : `min(${engineNumber(limit)}, ${wanted})`;
  return {
    lines: [
      `V${name} ${node(plus)} ${inside} 0`,
      `B${name} ${node(minus)} ${inside} I = ${bounded}`,
      `R${name} ${inside} ${node(minus)} ${engineNumber(bleedOhms)}`,
    ],
    currents: { [plus]: [{ vector: `i(v${name})`, sign: 1 }] },
    assumed: [],
  };
}
