import type { ModelResult } from '../models/fitted-model';
import { modelLine } from '../models/model-line';
import { ownCard } from '../models/own-card';
import type { NetlistPart } from '../netlist';
import type { KindEngine } from './kind-engine';
import { engineParameters } from './engine-parameters';

/** Engine half of a two-pin junction: its own card when a deck brought one, else the model of its facts. */
export function junctionEngine(fit: (part: NetlistPart) => ModelResult): KindEngine {
  return {
    controlPins: [],
    edges: () => [{ from: 'A', to: 'K', stiffness: 'soft' }],
    elements(part, { name, node, card }) {
      const model = card === undefined ? fit(part) : { card: ownCard(card), assumed: [] };
      if ('missing' in model) return model;
      return {
        lines: [
          `D${name} ${node('A')} ${node('K')} m${name}${engineParameters(card === undefined ? {} : part.params)}`,
          modelLine(`m${name}`, model.card),
        ],
        currents: { A: [{ vector: `i(@d${name}[id])`, sign: 1 }] },
        assumed: model.assumed,
      };
    },
  };
}
