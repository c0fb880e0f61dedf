import { modelLine } from '../models/model-line';
import { mosfetModel } from '../models/mosfet-model';
import { ownCardAtCorner } from '../models/own-card';
import type { KindEngine } from './kind-engine';
import { engineParameters } from './engine-parameters';

/**
 * Engine half of a MOSFET. A 0 V ammeter stands in the drain; at DC the gate takes no current, so the source gives what
 * the drain takes. Gate leakage is added by the run that asks for it (docs/engine.md 3.6).
 */
export function mosfetEngine(channel: 'n' | 'p'): KindEngine {
  return {
    controlPins: ['G'],
    edges: () => [
      { from: 'D', to: 'S', stiffness: 'soft' },
      { from: 'G', to: 'S', stiffness: 'none' },
    ],
    elements(part, { name, node, innerNode, card, corner }) {
      const model = card === undefined
        ? mosfetModel(part.facts, channel, corner)
        : { card: ownCardAtCorner(card, part.facts, corner), assumed: [] };
      if ('missing' in model) return model;
      const drain = innerNode('drain');
      const bulk = model.card.type === 'vdmos' ? '' : ` ${node('S')}`;
      const params = engineParameters(card === undefined ? {} : part.params);
      return {
        lines: [
          `V${name} ${node('D')} ${drain} 0`,
          `M${name} ${drain} ${node('G')} ${node('S')}${bulk} m${name}${params}`,
          modelLine(`m${name}`, model.card),
        ],
        currents: {
          D: [{ vector: `i(v${name})`, sign: 1 }],
          S: [{ vector: `i(v${name})`, sign: -1 }],
          G: [],
        },
        assumed: model.assumed,
      };
    },
  };
}
