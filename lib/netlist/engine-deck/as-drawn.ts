import type { DeckDocument } from '../deck/deck-document';
import { engineNumber } from '../models/model-line';
import type { Refusal } from '../points/point';
import { EngineNames } from './engine-names';
import type { PointEngine } from './engine-port';
import { flatten, FlattenFault, type FlatElement } from './flatten';
import { engineRefusal } from './refusal-words';
import { saveLines } from './save-lines';
import { isSimulated, writtenElement } from './written-element';

/** Options that move an operating point; others stay with their deck. */
const passedOptions = [
  'tnom', 'reltol', 'abstol', 'vntol', 'gmin', 'itl1', 'itl2', 'itl6', 'pivtol', 'pivrel', 'defl', 'defw', 'defad', 'defas',
];

export type DrawnRun =
  /** Volts by node: lower case, `x1.n` for node n inside X1, node 0 left out. */
  | { readonly status: 'ok'; readonly volts: Readonly<Record<string, number>> }
  /** `not-run`: an element is boxed and not simulated. */
  | { readonly status: 'refused'; readonly refusal: Refusal };

/**
 * Node voltages of a deck as ngspice itself reads the file: its own models and temperature (27 °C where it gives none),
 * each source at its DC value, an AC source at t = 0; fact lines change nothing. The deck is generated anew from what the
 * reader understood, never from its text.
 */
export async function asDrawn(engine: PointEngine, deck: DeckDocument): Promise<DrawnRun> {
  const flat = flatOrFault(deck);
  if (flat instanceof FlattenFault) return refused({ code: 'engine', words: flat.message, nodes: [], parts: [] });
  const boxed = flat.filter((element) => !isSimulated(element)).map(({ path }) => path);
  if (boxed.length > 0) {
    return refused({ code: 'not-run', words: `${boxed.join(', ')}: boxed and not simulated`, nodes: [], parts: boxed });
  }

  const names = new EngineNames();
  const elements = flat.flatMap((element, index) => writtenElement(element, `e${index + 1}`, (node) => names.node(node)));
  const nodes = [...new Set(flat.flatMap((element) => element.nodes))].filter((node) => node !== '0');
  if (nodes.length === 0) return { status: 'ok', volts: {} };
  const vectors = nodes.map((node) => `v(${names.node(node)})`);

  const answer = await engine.simulate({
    analysis: 'op', vectors, lines: [optionsLine(deck), ...elements, ...saveLines(vectors), '.op'].filter((line) => line !== ''),
  });
  if (!('values' in answer)) return refused(engineRefusal(answer.status, answer.messages, names));
  return { status: 'ok', volts: Object.fromEntries(nodes.map((node, index) => [node, answer.values[vectors[index] as string] ?? Number.NaN])) };
}

function flatOrFault(deck: DeckDocument): readonly FlatElement[] | FlattenFault {
  try {
    return flatten(deck.elements, deck);
  } catch (fault) {
    if (fault instanceof FlattenFault) return fault;
    throw fault;
  }
}

function optionsLine(deck: DeckDocument): string {
  const options = passedOptions.flatMap((key) => (deck.options[key] === undefined ? [] : [`${key}=${engineNumber(deck.options[key])}`]));
  const temperature = deck.temp === undefined ? [] : [`temp=${engineNumber(deck.temp)}`];
  const words = [...temperature, ...options];
  return words.length === 0 ? '' : `.options ${words.join(' ')}`;
}

function refused(refusal: Refusal): DrawnRun {
  return { status: 'refused', refusal };
}
