import { engineParameters } from '../kinds/engine-parameters';
import { engineNumber, modelLine } from '../models/model-line';
import { waveStart } from '../models/wave-start';
import type { FlatElement } from './flatten';

const simulated = 'RCLDMQVI';

/** Whether an element is simulated as its deck wrote it; others are boxes that nobody examines. */
export function isSimulated(flat: FlatElement): boolean {
  return simulated.includes(flat.element.letter);
}

/**
 * Lines of an element as its deck wrote it, under a generated name and on generated nodes, each source at its DC value,
 * else where its wave begins. Models stand as they are: ngspice reads them with its own defaults.
 */
export function writtenElement(flat: FlatElement, name: string, node: (name: string) => string): readonly string[] {
  const { element, card } = flat;
  const nodes = flat.nodes.map(node).join(' ');
  const head = `${element.letter}${name} ${nodes}`;
  if (element.letter === 'V' || element.letter === 'I') {
    const start = element.wave === undefined ? 0 : waveStart(element.wave);
    return [`${head} ${engineNumber(element.value ?? start)}`];
  }
  const model = card === undefined ? [] : [`m${name}`];
  const value = element.value === undefined ? [] : [engineNumber(element.value)];
  const words = 'DMQ'.includes(element.letter) ? [head, ...model] : [head, ...value, ...model];
  return [
    `${words.join(' ')}${engineParameters(element.params)}`,
    ...(card === undefined ? [] : [modelLine(`m${name}`, card)]),
  ];
}
