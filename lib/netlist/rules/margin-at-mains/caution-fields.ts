import type { Circuit } from '../../circuit/circuit';
import { isOwnResistor } from '../../circuit/part-nature';
import { isAlternating } from '../../circuit/source-role';
import { endNets } from '../../circuit/terminals';
import { walk } from '../../circuit/walk';
import type { FactKey } from '../../facts/fact-registry';
import type { NetlistPart } from '../../netlist';
import { isSourceTouchSafe } from '../../points/touch-safe';
import type { Station } from '../../points/station';
import type { Outcome } from '../rule';
import { atStation } from '../support/outcome';
import { listWords, say } from '../support/words';

const fields = [
  { key: 'isolated', words: 'isolation' }, { key: 'fuse', words: 'fuse' }, { key: 'bleeder', words: 'bleeder' }, { key: 'earth', words: 'earth' },
] as const satisfies readonly { readonly key: FactKey; readonly words: string }[];

/** A field is filled by a word on the source, or by the part itself on the sheet. */
function isFilled(circuit: Circuit, source: NetlistPart, key: (typeof fields)[number]['key']): boolean {
  if (source.facts[key] !== undefined) return true;
  const { parts, nets } = circuit.netlist;
  if (key === 'fuse') return parts.some((part) => part.kind === 'fuse');
  if (key === 'earth') return parts.some((part) => part.kind === 'earth') || nets.some((net) => net.facts.kind === 'earth' || net.facts.earth !== undefined);
  return key === 'bleeder' && hasBleeder(circuit, source);
}

/** A resistor from the source's bus to its return, or a part marked as one. */
function hasBleeder(circuit: Circuit, source: NetlistPart): boolean {
  const [plus, minus] = endNets(source) ?? ['', ''];
  const bus = walk(circuit.graph, plus, { through: ({ nature }) => nature === 'joint' });
  return circuit.netlist.parts.some((part) => {
    if (part.facts.bleeder !== undefined && part.id !== source.id) return true;
    const [a, b] = endNets(part) ?? ['', ''];
    return isOwnResistor(part) && ((bus.has(a) && b === minus) || (bus.has(b) && a === minus));
  });
}

/** Advice where the plan passes the touch-safe limit and the source does not say how people are kept from it. */
export function cautionFields(circuit: Circuit, stations: readonly Station[]): readonly Outcome[] {
  return stations.flatMap((station) => {
    const { power, volts } = station;
    if (!power || volts === null) return [];
    const base = { severity: 'advice', target: { source: [power.id] }, refs: [power.ref] } as const;
    const empty = fields.filter(({ key }) => !isFilled(circuit, power, key));
    const over = !isSourceTouchSafe(volts, isAlternating(power));
    const evidence = [
      { entity: power.ref, quantity: 'voltage', value: volts, unit: isAlternating(power) ? 'V rms' : 'V', source: 'plan' },
      ...(over ? [{
        entity: power.ref, quantity: 'fields filled', value: fields.length - empty.length, unit: '', source: 'facts of the source and parts of the sheet',
        limit: fields.length, limitSource: 'cautions above 60 V DC or 42.4 V peak, IEC 62368-1 ES1',
      }] : []),
    ];
    if (!over || empty.length === 0) return [atStation(station, { ...base, outcome: 'pass', message: `${power.ref} ${over ? 'says how people are kept from it' : 'is touch-safe here'}`, evidence })];
    return [atStation(station, {
      ...base, outcome: 'fail', evidence,
      message: `${power.ref} is at ${say(volts, 'V')}${isAlternating(power) ? ' rms' : ''}, above the touch-safe limit, and does not say its ${listWords(empty.map(({ words }) => words))}`,
      remedy: { words: `Fill in ${listWords(empty.map(({ words }) => words))} of ${power.ref}: what is fitted, or that there is none.` },
    })];
  });
}
