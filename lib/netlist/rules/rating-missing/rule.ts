import { labelOf } from '../../circuit/part-facts';
import { isInternal, isLoad, isOwnResistor } from '../../circuit/part-nature';
import { factRegistry, type FactKey } from '../../facts/fact-registry';
import { kindOf } from '../../kinds/kind-registry';
import type { Netlist, NetlistPart } from '../../netlist';
import type { Outcome, Rule, RuleParameters } from '../rule';
import { everywhere } from '../support/outcome';
import { powerRating } from '../support/resistor-heat';
import { inSentence, listWords } from '../support/words';

const parameters = {} satisfies RuleParameters;

const isGiven = (part: NetlistPart, fact: FactKey): boolean => part.facts[fact] !== undefined && part.facts[fact] !== '';

/** Facts that another one stands in for: a package's power, a capacitor's AC rating, one bound of a threshold, a colour's forward voltage. */
function standsIn(netlist: Netlist, part: NetlistPart, fact: FactKey): boolean {
  const modelled = part.model !== undefined && netlist.models.some((card) => card.name.toLowerCase() === part.model?.toLowerCase());
  switch (fact) {
    case 'pmax': return part.kind === 'resistor' && powerRating(part) !== undefined;
    case 'vmax': return isGiven(part, 'vmax_ac');
    case 'vth_min': case 'vth_max': return modelled || isGiven(part, 'vth_typ');
    case 'vf': return modelled || labelOf(part, 'colour') !== undefined;
    case 'hfe_min': return modelled || isGiven(part, 'hfe_typ') || isGiven(part, 'hfe_sat');
    default: return false;
  }
}

/** Loads, wires, contacts and the inside of other parts need no ratings of their own. */
function isExamined(part: NetlistPart): boolean {
  if (isInternal(part) || isLoad(part)) return false;
  return part.kind !== 'resistor' || isOwnResistor(part);
}

function judge(netlist: Netlist, part: NetlistPart): readonly Outcome[] {
  const ratings = kindOf(part.kind).fields.filter((field) => field.rating).map(({ fact }) => fact);
  if (ratings.length === 0 || !isExamined(part)) return [];
  const missing = ratings.filter((fact) => !isGiven(part, fact) && !standsIn(netlist, part, fact));
  const base = { severity: 'advice', target: { part: [part.id] }, refs: [part.ref] } as const;
  const evidence = ratings.map((fact) => ({ entity: part.ref, quantity: fact, value: !missing.includes(fact), unit: '', source: 'given on the sheet' }));
  if (missing.length === 0) return [everywhere({ ...base, outcome: 'pass', message: `${part.ref} has the ratings that rules ask for`, evidence })];
  const words = listWords(missing.map((fact) => inSentence(factRegistry[fact].label)));
  return [everywhere({
    ...base, outcome: 'fail', message: `${part.ref} has no ${words}: rules that need ${missing.length === 1 ? 'it' : 'them'} cannot decide`, evidence,
    remedy: { words: `Read ${missing.length === 1 ? 'it' : 'them'} off ${part.ref}’s data sheet (${missing.join(', ')}).` },
  })];
}

export const ratingMissing: Rule<typeof parameters> = {
  id: 'rating-missing', version: 1, title: 'Part without a rating that rules need', severity: 'advice', needs: 'topology', parameters,
  check: ({ netlist }) => netlist.parts.flatMap((part) => judge(netlist, part)),
};
