import type { FactDefinition } from '../facts/fact-definition';
import { factRegistry, isFactKey } from '../facts/fact-registry';
import type { FactValue } from '../netlist';
import type { DeckNotice, FactLine } from './deck-document';
import { deckLimits } from './deck-limits';
import type { DeckLine } from './deck-lines';
import { spiceNumber } from './spice-number';

/** Reads `NAME key=value …` (a line without its `*@`). Nothing in it is an error; what has no meaning is kept or skipped with a notice. */
export function readFactLine({ text, line }: DeckLine, notices: DeckNotice[]): FactLine | undefined {
  const name = /^\S*/.exec(text)?.[0] ?? '';
  const facts: Record<string, FactValue> = {};
  let rest = text.slice(name.length).trim();
  while (rest !== '' && !rest.startsWith(';')) {
    const { word, raw, after } = nextFact(rest);
    rest = after;
    if (raw === undefined || word === '') notices.push({ line, text: `${word || '='} on the fact line of ${name} is no key=value and is skipped.` });
    else addFact(facts, word.toLowerCase(), raw, name, line, notices);
  }
  if (name === '' || Object.keys(facts).length === 0) {
    notices.push({ line, text: name === '' ? 'A fact line without a name says nothing.' : `The fact line of ${name} gives no facts.` });
    return undefined;
  }
  return { line, name, facts };
}

/** The next `key=value`, spaces round the = allowed; a value in double quotes may hold spaces, `note=` takes the rest of the line. */
function nextFact(text: string): { word: string; raw?: string; after: string } {
  const word = /^[^=\s]*/.exec(text)?.[0] ?? '';
  const afterWord = text.slice(word.length).trimStart();
  if (!afterWord.startsWith('=')) return { word, after: afterWord };
  const tail = afterWord.slice(1).trimStart();
  if (word.toLowerCase() === 'note') return { word, raw: tail, after: '' };
  if (tail.startsWith('"')) return { word, ...quoted(tail) };
  const raw = /^\S*/.exec(tail)?.[0] ?? '';
  return { word, raw, after: tail.slice(raw.length).trimStart() };
}

function quoted(text: string): { raw: string; after: string } {
  let raw = '';
  let index = 1;
  for (; index < text.length && text[index] !== '"'; index++) {
    if (text[index] === '\\') index += 1;
    raw += text[index] ?? '';
  }
  return { raw, after: text.slice(index + 1).trim() };
}

function addFact(facts: Record<string, FactValue>, key: string, words: string, name: string, line: number, notices: DeckNotice[]): void {
  const raw = words.slice(0, deckLimits.fact);
  if (raw !== words) notices.push({ line, text: `${key} of ${name} is longer than ${deckLimits.fact} characters and is cut there.` });
  if (!isFactKey(key)) {
    notices.push({ line, text: `The fact ${key} of ${name} is not known; it is kept and no rule uses it.` });
    facts[key] = unknownValue(raw);
    return;
  }
  const definition = factRegistry[key];
  const value = factValue(definition, raw);
  if (value === undefined && !(key === 'value' && raw === missingValue)) {
    notices.push({ line, text: `${key}=${raw} of ${name} is not ${wanted(definition)}; it is kept as words and no rule uses it.` });
  } else if (typeof value === 'number' && outside(definition, value)) {
    notices.push({ line, text: `${key}=${raw} of ${name} is beyond what is possible.` });
  }
  facts[key] = value ?? raw;
}

/** What `value=` says of an element whose number stands in for one that nobody gave. */
export const missingValue = 'missing';

function unknownValue(raw: string): FactValue {
  return spiceNumber(raw) ?? (raw === 'yes' ? true : raw === 'no' ? false : raw);
}

function factValue(definition: FactDefinition, raw: string): FactValue | undefined {
  const flag = /^(?:yes|no)$/i.test(raw) ? raw.toLowerCase() === 'yes' : undefined;
  if (definition.type === 'label') return raw;
  if (definition.type === 'flag') return flag ?? (definition.unit === '' ? undefined : spiceNumber(raw));
  if (definition.type === 'quantity') return spiceNumber(raw);
  const [from, to, more] = raw.split('..').map(spiceNumber);
  return from === undefined || to === undefined || more !== undefined ? undefined : [from, to];
}

function outside({ min = -Infinity, max = Infinity }: FactDefinition, value: number): boolean {
  return value < min || value > max;
}

function wanted({ type, unit }: FactDefinition): string {
  if (type === 'flag') return unit === '' ? 'yes or no' : `yes, no or a number in ${unit}`;
  return type === 'range' ? 'a range a..b' : 'a number';
}
