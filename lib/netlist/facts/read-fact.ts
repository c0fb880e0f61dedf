import type { FieldDefinition, Kind } from '../kinds/kind';
import type { FactValue } from '../netlist';
import { editableQuantity, formatQuantity } from '../quantity/format-quantity';
import { parseQuantity, type ExpectedQuantity } from '../quantity/parse-quantity';
import type { FactDefinition } from './fact-definition';
import { factRegistry, type FactKey } from './fact-registry';

export type FactReading =
  | { readonly ok: true; readonly value: FactValue }
  /** What is wrong and what is wanted, for the person who typed. */
  | { readonly ok: false; readonly reason: string };

/** A fact as one kind of part has it: the registry's definition with the kind's own label, unit and bounds. */
export interface KindFact extends FactDefinition {
  /** Who wants the value in a refusal: 'a resistor', 'V_DS maximum'. */
  readonly subject: string;
}

export function factOfKind(kind: Kind, key: FactKey): KindFact {
  const field: Partial<FieldDefinition> = kind.fields.find((candidate) => candidate.fact === key) ?? {};
  const definition = factRegistry[key];
  const label = field.label ?? definition.label;
  return {
    ...definition,
    label,
    unit: field.unit ?? definition.unit,
    ...bound('min', field.min ?? definition.min),
    ...bound('max', field.max ?? definition.max),
    subject: key === 'value' ? withArticle(kind.title) : label,
  };
}

function bound(key: 'min' | 'max', value: number | undefined): Partial<Record<'min' | 'max', number>> {
  return value === undefined ? {} : { [key]: value };
}

/** 'a resistor', 'an inductor', 'a DC source': the title up to its comma. */
function withArticle(title: string): string {
  const words = title.split(',')[0] as string;
  const plain = /^[A-Z][a-z]/.test(words) ? words.charAt(0).toLowerCase() + words.slice(1) : words;
  return `${/^[aeiouA]/.test(plain) ? 'an' : 'a'} ${plain}`;
}

/** Longest label that a form takes. */
const maxLabelLength = 120;

/** Reads what a person typed into the field of a fact. */
export function readFact(kind: Kind, key: FactKey, typed: string): FactReading {
  const fact = factOfKind(kind, key);
  if (fact.type === 'label') return readLabel(typed, fact, key === 'text' || key === 'note' ? 2_000 : maxLabelLength);
  if (fact.type === 'flag') return readFlag(typed, fact);
  if (fact.type === 'range') return readRange(typed, fact);
  return parseQuantity(typed, expectedOf(fact));
}

function expectedOf(fact: KindFact): ExpectedQuantity {
  return { unit: fact.unit, subject: fact.subject, ...bound('min', fact.min), ...bound('max', fact.max) };
}

function readLabel(typed: string, fact: KindFact, longest: number): FactReading {
  const text = typed.trim();
  if (text === '') return refuse(`${fact.label} is empty; type a word or leave the field out.`);
  if (text.length > longest) return refuse(`${fact.label} takes at most ${longest} characters.`);
  if (longest === maxLabelLength && /\p{Cc}/u.test(text)) return refuse(`${fact.label} is one line without control characters.`);
  return { ok: true, value: text };
}

function readFlag(typed: string, fact: KindFact): FactReading {
  const word = typed.trim().toLowerCase();
  if (word === 'yes' || word === 'no') return { ok: true, value: word === 'yes' };
  if (fact.unit === '') return refuse(`${fact.label} wants yes or no.`);
  const reading = parseQuantity(typed, { unit: fact.unit, subject: fact.label, min: 0 });
  return reading.ok ? reading : refuse(`${fact.label} wants yes, no or a number with ${fact.unit}. ${reading.reason}`);
}

function readRange(typed: string, fact: KindFact): FactReading {
  const ends = typed.split(/\.\.|…| to /);
  if (ends.length !== 2) return refuse(`${fact.label} wants two values: 1k..10k.`);
  const [from, to] = ends.map((end) => parseQuantity(end, expectedOf(fact)));
  if (!from?.ok) return from ?? refuse(`${fact.label} wants two values: 1k..10k.`);
  if (!to?.ok) return to ?? refuse(`${fact.label} wants two values: 1k..10k.`);
  return from.value <= to.value ? { ok: true, value: [from.value, to.value] } : refuse(`${fact.label} starts with the smaller value.`);
}

/** A fact as printed beside a symbol or in a table. */
export function formatFact(kind: Kind, key: FactKey, value: FactValue): string {
  return written(factOfKind(kind, key).unit, value, formatQuantity);
}

/** A fact as it stands in its field while being edited; read again it gives the same value. */
export function editableFact(kind: Kind, key: FactKey, value: FactValue): string {
  return written(factOfKind(kind, key).unit, value, editableQuantity);
}

function written(unit: string, value: FactValue, number: (value: number, unit: string) => string): string {
  if (typeof value === 'string') return value;
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  if (typeof value === 'number') return number(value, unit);
  return `${number(value[0], unit)}..${number(value[1], unit)}`;
}

function refuse(reason: string): FactReading {
  return { ok: false, reason };
}
