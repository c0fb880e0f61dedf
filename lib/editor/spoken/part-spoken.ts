import { formatFact } from '@/lib/netlist/facts/read-fact';
import { netWords } from '@/lib/netlist/connectivity/net-words';
import { kindOf } from '@/lib/netlist/kinds/kind-registry';
import { sheetToNetlist } from '@/lib/document/nets/sheet-to-netlist';
import type { PartRecord, Sheet } from '@/lib/document/records';
import { drawnNetNames } from '../remedy/named-net';
import { drawnNets } from '@/lib/document/nets/drawn-net';

/** First value that a kind prints: `10 kΩ`; empty when it is not given. */
function mainValue(part: PartRecord): string {
  const kind = kindOf(part.kind);
  const key = kind.printed[0];
  const value = key === undefined ? undefined : part.facts[key];
  return key === undefined || value === undefined ? '' : formatFact(kind, key, value as Parameters<typeof formatFact>[2]);
}

/** What a part joins, in words: `from GATE to 0 V`, `G on GATE, D on SW, S on 0 V`, or `joined to nothing`. */
export function joinedWords(sheet: Sheet, part: PartRecord): string {
  const netlist = sheetToNetlist(sheet);
  const pins = Object.entries(netlist.parts.find((one) => one.id === part.id)?.pins ?? {}).map(([pin, net]) => [pin, netWords(netlist, net, part.ref)] as const);
  const [first, second] = pins;
  if (pins.every(([, net]) => net === 'nothing')) return 'joined to nothing';
  if (pins.length === 1 && first) return `on ${first[1]}`;
  if (pins.length === 2 && first && second) return `from ${first[1]} to ${second[1]}`;
  return pins.map(([pin, net]) => `${pin} on ${net}`).join(', ');
}

/** What a part is and what it joins, as it is spoken: `R2, 10 kΩ, from GATE to 0 V`. */
export function spokenPart(sheet: Sheet, part: PartRecord): string {
  const words = typeof part.facts.name === 'string' ? part.facts.name : typeof part.facts.text === 'string' ? part.facts.text : '';
  if (part.kind === 'note') return `Note: ${words}`;
  if (part.kind === 'net-name') return `Net name ${words}`;
  if (part.kind === 'zero-volt') return '0 V';
  if (part.kind === 'earth') return 'Earth';
  const lead = [part.ref, part.kind === 'box' ? 'not examined' : mainValue(part) || kindOf(part.kind).title].filter(Boolean).join(', ');
  const open = part.leftOpen.length > 0 ? `, ${part.leftOpen.join(' and ')} left open` : '';
  return `${lead}, ${joinedWords(sheet, part)}${open}`;
}

/** What a net joins, as a wire of it is spoken: `Wire, net GATE: Q1:G, R3:2`. */
function spokenNet(sheet: Sheet, number: number, refs: ReadonlyMap<string, string>): string {
  const name = drawnNetNames(sheet)[number];
  const pins = (drawnNets(sheet)[number]?.pins ?? []).filter((pin) => refs.get(pin.part)).map((pin) => `${refs.get(pin.part)}:${pin.pin}`);
  if (name === undefined) return 'Wire, joins no part';
  const net = sheetToNetlist(sheet).nets.find((one) => one.name === name);
  const called = name === '0' ? 'net 0 V' : net && net.givenNames.length === 0 ? 'unnamed net' : `net ${name}`;
  return `Wire, ${called}${pins.length > 0 ? `: ${pins.slice(0, 8).join(', ')}` : ''}`;
}

/** What a wire joins, as it is spoken. */
export const spokenWire = (sheet: Sheet, wireId: string): string => spokenItems(sheet).get(wireId) ?? 'Wire, joins no part';

const cache = new WeakMap<Sheet, ReadonlyMap<string, string>>();

/** What every part and wire of a sheet is called aloud, by id; worked out once for each sheet. */
export function spokenItems(sheet: Sheet): ReadonlyMap<string, string> {
  const known = cache.get(sheet);
  if (known) return known;
  const refs = new Map(sheet.parts.map((part) => [part.id, part.ref]));
  const spoken = new Map(sheet.parts.map((part) => [part.id, spokenPart(sheet, part)] as const));
  drawnNets(sheet).forEach((net, number) => {
    if (net.wires.length === 0) return;
    const words = spokenNet(sheet, number, refs);
    net.wires.forEach((wire) => spoken.set(wire, words));
  });
  cache.set(sheet, spoken);
  return spoken;
}
