import type { KindEngine } from '../kind-engine';
import { resistorElement } from '../engine-resistive';

export const resistorEngine: KindEngine = {
  controlPins: [],
  edges: () => [{ from: '1', to: '2', stiffness: 'solid' }],
  elements(part, context) {
    const ohms = part.facts.value;
    return typeof ohms === 'number' ? resistorElement(context, ['1', '2'], ohms) : { missing: 'value' };
  },
};
