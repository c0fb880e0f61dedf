import { compareNetNames } from '../connectivity/drawn-nets';
import { pinReference } from '../connectivity/pin-reference';
import { compareDesignators, nextDesignator } from '../designators/designator';
import type { FactKey } from '../facts/fact-registry';
import type { RemedyEdit } from '../findings/finding';
import type { KindId } from '../kinds/kind-id';
import { kindOf } from '../kinds/kind-registry';
import type { Facts, Net, Netlist, NetlistPart } from '../netlist';

type Edit<Name extends RemedyEdit['edit']> = Extract<RemedyEdit, { edit: Name }>;

function addPart(parts: readonly NetlistPart[], { kind, facts, pins }: Edit<'add part'>): readonly NetlistPart[] {
  const id = kind as KindId;
  const ref = nextDesignator(kindOf(id).letter ?? 'X', parts.map((part) => part.ref));
  return [...parts, { id: `proposed-${ref}`, ref, kind: id, pins, facts, origins: {}, leftOpen: [] }];
}

function withFacts(part: NetlistPart, changed: Edit<'set facts'>['facts']): NetlistPart {
  const facts: Record<string, Facts[FactKey]> = { ...part.facts };
  for (const [key, value] of Object.entries(changed)) {
    if (value === null) delete facts[key];
    else facts[key] = value;
  }
  return { ...part, facts };
}

const onPart = (parts: readonly NetlistPart[], ref: string, change: (part: NetlistPart) => NetlistPart): readonly NetlistPart[] =>
  parts.map((part) => (part.ref === ref ? change(part) : part));

function applyEdit(parts: readonly NetlistPart[], edit: RemedyEdit): readonly NetlistPart[] {
  switch (edit.edit) {
    case 'add part': return addPart(parts, edit);
    case 'set facts': return onPart(parts, edit.part, (part) => withFacts(part, edit.facts));
    case 'move pin': return onPart(parts, edit.part, (part) => ({ ...part, pins: { ...part.pins, [edit.pin]: edit.net } }));
    case 'swap pins': return onPart(parts, edit.part, (part) => {
      const [a, b] = edit.pins;
      return { ...part, pins: { ...part.pins, [a]: part.pins[b] ?? '', [b]: part.pins[a] ?? '' } };
    });
    case 'rename part': return parts.map((part) => (part.id === edit.partId ? { ...part, ref: edit.ref } : part));
    case 'leave open': return onPart(parts, edit.part, (part) => ({ ...part, leftOpen: [...part.leftOpen, edit.pin] }));
    case 'rename net': return parts.map((part) => ({
      ...part, pins: Object.fromEntries(Object.entries(part.pins).map(([pin, net]) => [pin, net === edit.from ? edit.to : net])),
    }));
  }
}

function netsOf(parts: readonly NetlistPart[], known: readonly Net[]): readonly Net[] {
  const pins = new Map<string, string[]>();
  for (const part of parts) for (const [pin, net] of Object.entries(part.pins)) pins.set(net, [...(pins.get(net) ?? []), pinReference(part, pin)]);
  return [...pins].map(([name, members]): Net => {
    const before = known.find((net) => net.name === name);
    return { name, givenNames: before?.givenNames ?? [name], pins: members, facts: before?.facts ?? {} };
  }).sort((a, b) => compareNetNames(a.name, b.name));
}

/** The netlist as it would stand with a proposed change taken. */
export function applyRemedy(netlist: Netlist, edits: readonly RemedyEdit[]): Netlist {
  const parts = [...edits.reduce(applyEdit, netlist.parts)].sort((a, b) => compareDesignators(a.ref, b.ref));
  return { ...netlist, parts, nets: netsOf(parts, netlist.nets) };
}
