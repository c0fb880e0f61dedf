import { engineNumber } from '../../models/model-line';
import { groundEnd, type KindEngine } from '../kind-engine';
import { sourceEngine } from '../engine-source';
import { drawnLevel } from '../engine-source-level';

/** Ties a floating mains circuit to 0 V without carrying a current that matters, ohms (docs/engine.md 3.5). */
const referenceOhms = 1e6;

const source = sourceEngine(['L', 'N'], (part, setting) => setting.volts ?? drawnLevel(part) ?? 0, 'rms');

/** Mains at one DC level, which the run sets: plus or minus its peak. As drawn it stands at t = 0. */
export const acMainsEngine: KindEngine = {
  controlPins: [],
  edges: (part) => [...source.edges(part), { from: 'N', to: groundEnd, stiffness: 'solid' }],
  elements(part, context) {
    const elements = source.elements(part, context);
    if ('missing' in elements || context.node('N') === '0') return elements;
    const reference = `R${context.name}n ${context.node('N')} 0 ${engineNumber(referenceOhms)}`;
    return { ...elements, lines: [...elements.lines, reference] };
  },
};
