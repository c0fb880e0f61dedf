import { isYes } from '../../circuit/part-facts';
import { factRegistry, type FactKey } from '../../facts/fact-registry';
import { kindOf } from '../../kinds/kind-registry';
import type { FieldDefinition } from '../../kinds/kind';
import type { Netlist, NetlistPart } from '../../netlist';
import type { Outcome, Rule, RuleParameters } from '../rule';
import { everywhere } from '../support/outcome';
import { inSentence, listWords } from '../support/words';

const parameters = {} satisfies RuleParameters;

/** A wave or a model card says what the facts would. */
function isModelled(netlist: Netlist, part: NetlistPart): boolean {
  if (part.wave) return true;
  return part.model !== undefined && netlist.models.some((card) => card.name.toLowerCase() === part.model?.toLowerCase());
}

/** A generator with one level, or with a plain value, swings between that and 0 (`docs/rules.md`, "States"). */
function isImplied({ kind, facts }: NetlistPart, fact: FactKey): boolean {
  if (kind !== 'signal-generator') return false;
  return (fact === 'high' || fact === 'low') && (facts.value !== undefined || (fact === 'low' && facts.high !== undefined));
}

const missingFields = (part: NetlistPart): readonly FieldDefinition[] => kindOf(part.kind).fields
  .filter(({ fact, required }) => required && (part.facts[fact] === undefined || part.facts[fact] === '') && !isImplied(part, fact));

const wordsOf = ({ fact, label }: FieldDefinition): string => inSentence(label ?? factRegistry[fact].label);

function judge(netlist: Netlist, part: NetlistPart): readonly Outcome[] {
  const required = kindOf(part.kind).fields.filter((field) => field.required);
  if (required.length === 0 || isYes(part, 'wire')) return [];
  const base = { severity: 'caution', target: { part: [part.id] }, refs: [part.ref] } as const;
  const missing = isModelled(netlist, part) ? [] : missingFields(part);
  const evidence = required.map(({ fact }) => ({ entity: part.ref, quantity: fact, value: part.facts[fact] !== undefined || !missing.some((field) => field.fact === fact), unit: '', source: 'given on the sheet' }));
  if (missing.length === 0) return [everywhere({ ...base, outcome: 'pass', message: `${part.ref} has the values it needs`, evidence })];
  const words = listWords(missing.map(wordsOf));
  return [everywhere({
    ...base, outcome: 'fail', message: `${part.ref} has no ${words}: nothing it carries can be worked out`, evidence,
    remedy: { words: `Give ${part.ref} its ${words}.` },
  })];
}

export const valueMissing: Rule<typeof parameters> = {
  id: 'value-missing', version: 1, title: 'Part without its value', severity: 'caution', needs: 'topology', parameters,
  check: ({ netlist }) => netlist.parts.flatMap((part) => judge(netlist, part)),
};
