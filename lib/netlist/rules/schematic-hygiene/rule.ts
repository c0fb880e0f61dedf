import { isYes, quantityOf } from '../../circuit/part-facts';
import { isCapacitor, isInternal, isLoad, isOwnResistor } from '../../circuit/part-nature';
import { nextDesignator, splitDesignator } from '../../designators/designator';
import { kindOf } from '../../kinds/kind-registry';
import type { NetlistPart } from '../../netlist';
import { isPreferred, nearest, type SeriesName } from '../../series/preferred-values';
import type { Outcome, Rule, RuleParameters } from '../rule';
import { everywhere } from '../support/outcome';
import { inSentence, listWords, say } from '../support/words';
import { classLetters } from './class-letters';

const parameters = {} satisfies RuleParameters;

const source = 'IEC 60063 preferred values';

/** Series in which each kind is sold: resistors in E24 and E96, capacitors in E24. */
function seriesOf(part: NetlistPart): { readonly unit: string; readonly series: readonly SeriesName[] } | null {
  if (isOwnResistor(part)) return { unit: 'Ω', series: ['E24', 'E96'] };
  if (isCapacitor(part) && !isInternal(part) && !isLoad(part)) return { unit: 'F', series: ['E24'] };
  return null;
}

function judgeValue(part: NetlistPart): readonly Outcome[] {
  const sold = seriesOf(part);
  const value = quantityOf(part, 'value');
  if (!sold || value === undefined || value <= 0) return [];
  const base = { severity: 'advice', target: { part: [part.id], point: ['value'] }, refs: [part.ref] } as const;
  const near = sold.series.map((series) => nearest(value, series)).sort((a, b) => Math.abs(a - value) - Math.abs(b - value))[0]!;
  const evidence = [
    { entity: part.ref, quantity: 'value', value, unit: sold.unit, source: part.origins.value ?? 'typed' },
    { entity: part.ref, quantity: 'distance from the E-series', value: Math.abs(value / near - 1), unit: '', source: `nearest is ${say(near, sold.unit)}`, limit: 1e-9, limitSource: source },
  ];
  if (sold.series.some((series) => isPreferred(value, series))) return [everywhere({ ...base, outcome: 'pass', message: `${part.ref} has a value of the E-series`, evidence })];
  return [everywhere({
    ...base, outcome: 'fail', evidence,
    message: `${part.ref}: ${say(value, sold.unit)} is not made; ${say(near, sold.unit)} is the nearest of ${listWords(sold.series)}`,
    remedy: { words: `Use ${say(near, sold.unit)}.`, edits: [{ edit: 'set facts', part: part.ref, facts: { value: near } }] },
  })];
}

/** A deck's speaking names (`RLOAD`, `VDD`) carry their class letter without a number. */
function hasClassLetter(ref: string, accepted: readonly string[]): boolean {
  const letters = splitDesignator(ref)?.letters.toUpperCase();
  return letters === undefined ? accepted.some((letter) => ref.toUpperCase().startsWith(letter)) : accepted.includes(letters);
}

function judgeDesignator(part: NetlistPart, taken: readonly string[]): readonly Outcome[] {
  const accepted = classLetters[part.kind];
  if (!accepted || part.ref === '' || isInternal(part) || isLoad(part) || isYes(part, 'wire')) return [];
  const base = { severity: 'advice', target: { part: [part.id], point: ['designator'] }, refs: [part.ref] } as const;
  const usual = hasClassLetter(part.ref, accepted);
  const evidence = [{ entity: part.ref, quantity: 'class letter of its kind', value: usual, unit: '', source: 'sheet', limitSource: 'ASME Y14.44 and everyday use' }];
  if (usual) return [everywhere({ ...base, outcome: 'pass', message: `${part.ref} has a class letter of its kind`, evidence })];
  const ref = nextDesignator(accepted[0]!, taken);
  return [everywhere({
    ...base, outcome: 'fail', evidence,
    message: `${part.ref} is drawn as ${inSentence(kindOf(part.kind).title)}: its designator usually is ${accepted[0]} and a number`,
    remedy: { words: `Call it ${ref}.`, edits: [{ edit: 'rename part', partId: part.id, ref }] },
  })];
}

export const schematicHygiene: Rule<typeof parameters> = {
  id: 'schematic-hygiene', version: 1, title: 'Values and designators off the standards', severity: 'advice', needs: 'topology', parameters,
  check: ({ netlist }) => {
    const taken = netlist.parts.map((part) => part.ref);
    return netlist.parts.flatMap((part) => [...judgeValue(part), ...judgeDesignator(part, taken)]);
  },
};
