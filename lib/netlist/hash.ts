import { sha256 } from '@noble/hashes/sha2.js';
import { bytesToHex, utf8ToBytes } from '@noble/hashes/utils.js';
import { addToList } from './connectivity/add-to-list';
import { byCodeUnit } from './designators/designator';
import type { DeckElement, Netlist, NetlistPart, Subcircuit } from './netlist';

/** JSON with keys in code-unit order and without undefined members: equal values give equal texts. */
export function canonicalJson(value: unknown): string {
  if (Array.isArray(value)) return `[${value.map((item) => canonicalJson(item ?? null)).join(',')}]`;
  if (value === null || typeof value !== 'object') return JSON.stringify(value) ?? 'null';
  const entries = Object.entries(value).filter(([, member]) => member !== undefined).sort(([a], [b]) => byCodeUnit(a, b));
  return `{${entries.map(([key, member]) => `${JSON.stringify(key)}:${canonicalJson(member)}`).join(',')}}`;
}

/** SHA-256 of the canonical JSON of a value, 64 hex digits. */
export function hashOf(value: unknown): string {
  return bytesToHex(sha256(utf8ToBytes(canonicalJson(value))));
}

/**
 * Content hash of a revision: designators, kinds, values, ratings, waves, models, connectivity, scenarios and plan. Not the title,
 * ids, notes, net names, test points, *left open* marks or where a value came from: none of them changes what the circuit does.
 */
export function contentHash(netlist: Netlist): string {
  return hashOf({
    format: netlist.format,
    ...connectivity(netlist),
    models: [...netlist.models].sort((a, b) => byCodeUnit(a.name, b.name)),
    subcircuits: netlist.subcircuits.map(withoutLines).sort((a, b) => byCodeUnit(a.name, b.name)),
    scenarios: [...netlist.scenarios].sort((a, b) => byCodeUnit(a.name, b.name)),
    holdPoints: [...netlist.holdPoints].sort((a, b) => a.volts - b.volts || byCodeUnit(a.name, b.name)),
  });
}

function withoutLines(subcircuit: Subcircuit): { readonly name: string; readonly [member: string]: unknown } {
  return {
    ...subcircuit,
    elements: subcircuit.elements.map(({ line: _line, ...element }: DeckElement) => element),
    subcircuits: subcircuit.subcircuits.map(withoutLines),
  };
}

/** What a part is, apart from where its pins go. */
function description({ ref, kind, facts, wave, model, params }: NetlistPart): string {
  const { note: _note, ...electrical } = facts;
  return canonicalJson({ ref, kind, facts: electrical, wave, model, params: params && Object.keys(params).length > 0 ? params : undefined });
}

/**
 * Parts with numbered nets, independent of names, ids and order. A net's number comes from the pins on it; where designators
 * are doubled, parts and nets are told apart by what they are joined to, step by step, until nothing more is told apart.
 */
function connectivity(netlist: Netlist): object {
  const parts = netlist.parts.filter((part) => part.kind !== 'test-point');
  const descriptions = parts.map(description);
  const nets = new Map(netlist.nets.map((net) => [net.name, canonicalJson({ zero: net.name === '0', facts: net.facts })]));
  let partNumbers = ranks(descriptions);
  let netNumbers = new Map<string, number>();
  for (let told = 0, before = -1; told > before;) {
    before = told;
    const members = new Map<string, string[]>();
    parts.forEach((part, index) => Object.entries(part.pins).forEach(([pin, net]) => {
      addToList(members, net, `${partNumbers[index]}:${pin}`);
    }));
    const names = [...members.keys()];
    const numbers = ranks(names.map((name) => canonicalJson([nets.get(name), (members.get(name) as string[]).sort(byCodeUnit)])));
    netNumbers = new Map(names.map((name, index) => [name, numbers[index] as number]));
    partNumbers = ranks(parts.map((part, index) => canonicalJson([descriptions[index], pinNumbers(part, netNumbers)])));
    told = new Set(partNumbers).size + new Set(numbers).size;
  }
  return {
    parts: parts.map((part, index) => canonicalJson([descriptions[index], pinNumbers(part, netNumbers)])).sort(byCodeUnit),
    nets: [...netNumbers].map(([name, number]) => canonicalJson([number, nets.get(name)])).sort(byCodeUnit),
  };
}

function pinNumbers(part: NetlistPart, netNumbers: ReadonlyMap<string, number>): object {
  return Object.fromEntries(Object.entries(part.pins).map(([pin, net]) => [pin, netNumbers.get(net)]));
}

/** Position of each text among the distinct ones in order. */
function ranks(texts: readonly string[]): number[] {
  const order = new Map([...new Set(texts)].sort(byCodeUnit).map((text, index) => [text, index]));
  return texts.map((text) => order.get(text) as number);
}
