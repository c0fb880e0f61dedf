import { bipolarModel } from '../models/bipolar-model';
import { modelLine } from '../models/model-line';
import { ownCard } from '../models/own-card';
import type { KindEngine } from './kind-engine';
import { engineParameters } from './engine-parameters';

/** Engine half of a bipolar transistor, with 0 V ammeters in collector and base. */
export function bipolarEngine(type: 'npn' | 'pnp'): KindEngine {
  return {
    controlPins: ['B'],
    edges: () => [
      { from: 'B', to: 'E', stiffness: 'soft' },
      { from: 'B', to: 'C', stiffness: 'soft' },
    ],
    elements(part, { name, node, innerNode, card, corner }) {
      const model = card === undefined ? bipolarModel(part.facts, type, corner) : { card: ownCard(card), assumed: [] };
      if ('missing' in model) return model;
      const [collector, base] = [innerNode('collector'), innerNode('base')];
      const params = engineParameters(card === undefined ? {} : part.params);
      return {
        lines: [
          `V${name}c ${node('C')} ${collector} 0`,
          `V${name}b ${node('B')} ${base} 0`,
          `Q${name} ${collector} ${base} ${node('E')} m${name}${params}`,
          modelLine(`m${name}`, model.card),
        ],
        currents: {
          C: [{ vector: `i(v${name}c)`, sign: 1 }],
          B: [{ vector: `i(v${name}b)`, sign: 1 }],
          E: [{ vector: `i(v${name}c)`, sign: -1 }, { vector: `i(v${name}b)`, sign: -1 }],
        },
        assumed: model.assumed,
      };
    },
  };
}
