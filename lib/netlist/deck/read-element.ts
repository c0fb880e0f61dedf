import type { DeckElement, ModelCard } from '../netlist';
import { examinedLetters, type DeckNotice } from './deck-document';
import { deckLimits } from './deck-limits';
import type { DeckLine } from './deck-lines';
import { DeckRefusal } from './deck-refusal';
import { instanceParameters } from './known-parameters';
import { checkName, nameKey } from './names';
import { readSource } from './read-source';
import { readsAsMilli } from './spice-number';
import { splitPairs, type Numbers, type Pair } from './statement';
import { tokensOf, type Token } from './tokens';
import { unexaminedElement } from './unexamined-element';

export interface ElementContext {
  readonly numbers: Numbers;
  readonly notices: DeckNotice[];
  /** A model card in reach of the element, by lower-case name. */
  model(key: string): ModelCard | undefined;
}

type Body = Partial<Pick<DeckElement, 'value' | 'wave' | 'model'>> & Pick<DeckElement, 'nodes'> & { readonly area?: number };

/** Reads an element statement. Throws `DeckRefusal` on one that no SPICE could take either. */
export function readElement({ text, line }: DeckLine, context: ElementContext): DeckElement {
  const name = text.split(/[\s(=]/, 1)[0] as string;
  checkName(name, 'The element', line);
  const letter = name.charAt(0).toUpperCase();
  if (!examinedLetters.includes(letter)) return unexaminedElement(letter, name, text, line, context.notices);
  const tokens = tokensOf(text, line).filter((token) => token.kind !== 'equals' || !isSource(letter));
  const { words, pairs } = splitPairs(tokens, line);
  const body = readBody(letter, name, [...words.slice(1), ...ownValue(letter, pairs)], context, line);
  if (body.nodes.length > deckLimits.nodes) throw new DeckRefusal(line, `${name} has more than ${deckLimits.nodes} nodes.`);
  for (const node of body.nodes) checkName(node, `A node of ${name}`, line);
  const { area, ...rest } = body;
  const params = readParams(letter, name, pairs, context, line);
  return { letter, name, ...rest, params: area === undefined ? params : { area, ...params }, line };
}

/** `DC=5` is as good as `DC 5`. */
function isSource(letter: string): boolean {
  return letter === 'V' || letter === 'I';
}

/** `R1 a b R=1k`: the value of a passive element under its own letter. */
function ownValue(letter: string, pairs: readonly Pair[]): Token[] {
  return 'RCL'.includes(letter) ? pairs.filter(({ key }) => key === letter.toLowerCase()).map(({ value }) => value) : [];
}

function readBody(letter: string, name: string, words: readonly Token[], context: ElementContext, line: number): Body {
  switch (letter) {
    case 'R': case 'C': case 'L': return passive(name, words, context, line);
    case 'V': case 'I': return { nodes: nodes(name, words, 2, line), ...readSource(name, words.slice(2), context.numbers, line) };
    case 'D': return withModel(name, words, 2, context, line);
    case 'Q': return withModel(name, words, bipolarNodes(words, context), context, line);
    case 'M': return withModel(name, words, mosfetNodes(words, context), context, line);
    default: return subcircuitCall(name, words, line);
  }
}

/** Names of the first `count` words, which must be there. */
function nodes(name: string, words: readonly Token[], count: number, line: number): string[] {
  const found = words.slice(0, count).filter((token) => token.kind === 'word').map((token) => token.text);
  if (found.length < count) throw new DeckRefusal(line, `${name} has too few nodes: it takes ${count}.`);
  return found;
}

/** A value, a model, a model and a value, or for R a value and a model, as ngspice takes them. */
function passive(name: string, words: readonly Token[], { numbers, notices }: ElementContext, line: number): Body {
  const ends = nodes(name, words, 2, line);
  const [, second, third, fourth, ...rest] = words;
  if (!third) {
    if (numbers.tryRead(second as Token, line) !== undefined) {
      throw new DeckRefusal(line, `${name} has too few nodes: it takes two and a value.`);
    }
    notices.push({ line, text: `${name} has no value.` });
    return { nodes: ends };
  }
  if (rest.length > 0) throw new DeckRefusal(line, `${name}: ${(rest[0] as Token).text} is not understood.`);
  const value = numbers.tryRead(third, line);
  if (value !== undefined && fourth) {
    if (/^r/i.test(name) && fourth.kind === 'word' && /^[A-Za-z_]/.test(fourth.text)) return { nodes: ends, value, model: fourth.text };
    throw new DeckRefusal(line, `${name}: ${fourth.text} is not understood after its value.`);
  }
  if (value === undefined && (third.kind !== 'word' || !/^[A-Za-z_]/.test(third.text))) numbers.read(third, line);
  if (third.kind === 'word' && readsAsMilli(third.text)) notices.push({ line, text: `${name}: ${third.text} is a thousandth in a deck; a million is written MEG.` });
  if (value !== undefined) return { nodes: ends, value };
  return { nodes: ends, model: third.text, ...(fourth ? { value: numbers.read(fourth, line) } : {}) };
}

/** Nodes, a model, then at most OFF and, but for M, an area. */
function withModel(name: string, words: readonly Token[], count: number, { numbers }: ElementContext, line: number): Body {
  const letter = name.charAt(0).toUpperCase();
  const found = nodes(name, words, count, line);
  const [model, ...rest] = words.slice(count);
  if (model?.kind !== 'word') throw new DeckRefusal(line, `${name} has too few nodes or no model: it takes ${count} nodes and a model.`);
  const [area, extra] = rest.filter((token) => token.text.toLowerCase() !== 'off');
  if (extra) throw new DeckRefusal(line, `${name}: ${extra.text} is not understood after its model ${model.text}.`);
  if (!area) return { nodes: found, model: model.text };
  const number = letter === 'M' ? undefined : numbers.tryRead(area, line);
  if (number === undefined) throw new DeckRefusal(line, `${name}: ${area.text} is not understood after its model ${model.text}.`);
  return { nodes: found, model: model.text, area: number };
}

/** Three nodes, or four with a substrate: the word after the fourth node is then the model. */
function bipolarNodes(words: readonly Token[], context: ElementContext): number {
  const isModel = (index: number) => words[index]?.kind === 'word' && context.model(nameKey((words[index] as Token).text)) !== undefined;
  return !isModel(3) && isModel(4) ? 4 : 3;
}

/** Four nodes; a VDMOS card takes three. */
function mosfetNodes(words: readonly Token[], context: ElementContext): number {
  const fourth = words[3];
  return fourth && context.model(nameKey(fourth.text))?.type === 'vdmos' ? 3 : 4;
}

function subcircuitCall(name: string, words: readonly Token[], line: number): Body {
  const plain = words.filter((token) => token.kind === 'word' && !/^params:$/i.test(token.text)).map((token) => token.text);
  if (plain.length < 2) throw new DeckRefusal(line, `${name} takes its nodes and the name of a subcircuit.`);
  return { nodes: plain.slice(0, -1), model: plain.at(-1) as string };
}

function readParams(letter: string, name: string, pairs: readonly Pair[], context: ElementContext, line: number): Record<string, number> {
  const params: Record<string, number> = {};
  for (const { key, value } of pairs) {
    if (ownValue(letter, [{ key, value }]).length > 0) continue;
    if (letter === 'X') throw new DeckRefusal(line, `${name}: parameters of a subcircuit are not read; put the numbers into the subcircuit.`);
    if (instanceParameters[letter]?.has(key)) params[key] = context.numbers.read(value, line);
    else context.notices.push({ line, text: `${name}: the parameter ${key} is not known and left out.` });
  }
  return params;
}
