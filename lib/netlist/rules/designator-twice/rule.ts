import { nextDesignator } from '../../designators/designator';
import { isInternal } from '../../circuit/part-nature';
import { kindOf } from '../../kinds/kind-registry';
import type { NetlistPart } from '../../netlist';
import type { Outcome, Rule, RuleParameters } from '../rule';
import { everywhere } from '../support/outcome';

const parameters = {} satisfies RuleParameters;

/** Contacts of one plug share its designator as long as their numbers differ (IEC 61666 pins). */
function isOnePlug(parts: readonly NetlistPart[]): boolean {
  const contacts = parts.map((part) => part.facts.contact);
  return parts.every((part) => part.kind === 'plug-contact') && !contacts.includes(undefined) && new Set(contacts).size === contacts.length;
}

/** Parts that carry a designator, by it; case does not tell two designators apart. */
function byDesignator(parts: readonly NetlistPart[]): readonly (readonly NetlistPart[])[] {
  const groups = new Map<string, NetlistPart[]>();
  for (const part of parts) {
    if (kindOf(part.kind).letter === null && part.ref === '') continue;
    const key = part.ref.toUpperCase();
    groups.set(key, [...(groups.get(key) ?? []), part]);
  }
  return [...groups.values()];
}

const letterOf = (part: NetlistPart): string => kindOf(part.kind).letter ?? 'U';

function nameless(part: NetlistPart, taken: readonly string[]): Outcome {
  const ref = nextDesignator(letterOf(part), taken);
  return everywhere({
    outcome: 'fail', severity: 'caution', target: { part: [part.id] }, refs: [], nets: Object.values(part.pins),
    message: `A part of kind ${kindOf(part.kind).title} has no designator`,
    evidence: [{ entity: part.id, quantity: 'designator', value: '', unit: '', source: 'sheet' }],
    remedy: { words: `Call it ${ref}.`, edits: [{ edit: 'rename part', partId: part.id, ref }] },
  });
}

/** The first part keeps the designator; the proposed change renames the others. */
function doubled(parts: readonly NetlistPart[], taken: readonly string[]): Outcome {
  const [first, ...others] = parts;
  const refs: string[] = [...taken];
  const edits = others.map((part) => {
    const ref = nextDesignator(letterOf(part), refs);
    refs.push(ref);
    return { edit: 'rename part', partId: part.id, ref } as const;
  });
  return everywhere({
    outcome: 'fail', severity: 'caution', target: { part: parts.map((part) => part.id).sort() }, refs: [first!.ref], nets: [],
    message: `${parts.length} parts are called ${first!.ref}: readings and sign-offs could mean either`,
    evidence: [{ entity: first!.ref, quantity: 'parts of this name', value: parts.length, unit: '', source: 'sheet', limit: 1, limitSource: 'a designator names one part (ASME Y14.44)' }],
    remedy: { words: `Call the others ${edits.map(({ ref }) => ref).join(', ')}.`, edits },
  });
}

function single(group: readonly NetlistPart[]): Outcome {
  const { ref } = group[0]!;
  return everywhere({
    outcome: 'pass', severity: 'caution', target: { part: group.map((part) => part.id).sort() }, refs: [ref], nets: [],
    message: group.length === 1 ? `${ref} names one part` : `${ref} names the contacts of one plug`,
    evidence: [{ entity: ref, quantity: 'parts of this name', value: 1, unit: '', source: 'sheet', limit: 1, limitSource: 'a designator names one part (ASME Y14.44)' }],
  });
}

export const designatorTwice: Rule<typeof parameters> = {
  id: 'designator-twice', version: 1, title: 'Designator given twice or missing', severity: 'caution', needs: 'topology', parameters,
  check: ({ netlist }) => {
    const parts = netlist.parts.filter((part) => !isInternal(part));
    const taken = parts.map((part) => part.ref);
    return byDesignator(parts).flatMap((group): readonly Outcome[] => {
      if (group[0]!.ref === '') return group.map((part) => nameless(part, taken));
      return [group.length > 1 && !isOnePlug(group) ? doubled(group, taken) : single(group)];
    });
  },
};
