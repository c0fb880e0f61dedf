import type { RemedyEdit } from '@/lib/netlist/findings/finding';
import { turnedBy } from '@/lib/document/geometry/turn';
import { pinPlaceOf } from '@/lib/document/geometry/pin-place';
import type { PartRecord, Sheet, WireEnd } from '@/lib/document/records';
import { refusedRef } from '../edits/designators';
import { withParts, type NewId } from '../edits/edit';
import { markOpen } from '../edits/mark-open';
import { refusedFact, setFacts } from '../edits/set-facts';
import { addRemedyPart } from './add-remedy-part';
import { detachPin } from './detach-pin';
import { joinToNet } from './join-to-net';
import { holdNet, netOfPin, type HeldNet, type PinName } from './named-net';

/** A sheet with a proposed change in it and what it touched, or why it cannot be taken. */
export type Taken = { readonly sheet: Sheet; readonly touched: readonly string[] } | { readonly refused: string };

/** Applies the edits of a proposed change in turn: all of them, or none. */
export function takeChange(sheet: Sheet, edits: readonly RemedyEdit[], newId: NewId): Taken {
  let current = sheet;
  const touched: string[] = [];
  const nets = heldNets(sheet, edits);
  for (const edit of edits) {
    const step = takeEdit(current, edit, nets, newId);
    if ('refused' in step) return step;
    current = step.sheet;
    touched.push(...step.touched);
  }
  return { sheet: current, touched };
}

/** Every net that the edits name, as it stands before the first of them. */
function heldNets(sheet: Sheet, edits: readonly RemedyEdit[]): ReadonlyMap<string, HeldNet> {
  const names = edits.flatMap((edit) => (edit.edit === 'add part' ? Object.values(edit.pins) : edit.edit === 'move pin' ? [edit.net] : []));
  return new Map(names.flatMap((name) => {
    const held = holdNet(sheet, name);
    return held ? [[name, held] as const] : [];
  }));
}

function takeEdit(sheet: Sheet, edit: RemedyEdit, nets: ReadonlyMap<string, HeldNet>, newId: NewId): Taken {
  if (edit.edit === 'add part') {
    const added = addRemedyPart(sheet, edit, nets, newId);
    return 'refused' in added ? added : { sheet: added.sheet, touched: [added.part] };
  }
  if (edit.edit === 'rename net') {
    const isNamed = (part: PartRecord) => part.kind === 'net-name' && typeof part.facts.name === 'string' && part.facts.name.trim() === edit.from;
    const named = sheet.parts.filter(isNamed);
    if (named.length === 0) return { refused: `No net is called ${edit.from} any more.` };
    return { sheet: withParts(sheet, (part) => (isNamed(part) ? { ...part, facts: { ...part.facts, name: edit.to } } : part)), touched: named.map((part) => part.id) };
  }
  const wanted = edit.edit === 'rename part' ? edit.partId : edit.part;
  const part = sheet.parts.find((one) => (edit.edit === 'rename part' ? one.id : one.ref) === wanted);
  if (!part) return { refused: `${wanted} is no longer on the sheet.` };
  switch (edit.edit) {
    case 'rename part': {
      const refused = refusedRef(sheet, part, edit.ref);
      return refused ? { refused } : { sheet: withParts(sheet, (one) => (one === part ? { ...one, ref: edit.ref } : one)), touched: [part.id] };
    }
    case 'set facts': {
      const refused = Object.entries(edit.facts).map(([key, value]) => refusedFact(key, value)).find((words) => words !== null);
      return refused ? { refused } : { sheet: setFacts(sheet, part.id, edit.facts), touched: [part.id] };
    }
    case 'leave open':
      return { sheet: markOpen(sheet, part.id, edit.pin, true), touched: [part.id] };
    case 'move pin':
      return movePin(sheet, part, edit.pin, nets.get(edit.net) ?? null, newId);
    case 'swap pins':
      return swapPins(sheet, part, edit.pins, newId);
  }
}

function movePin(sheet: Sheet, part: PartRecord, pin: string, net: HeldNet | null, newId: NewId): Taken {
  if (!net) return { refused: 'The net it should go to is no longer there. The change was proposed for an older state.' };
  const free = detachPin(sheet, { part: part.id, pin }, newId);
  if (!free) return { refused: `${part.ref}:${pin} stands on another pin. Move ${part.ref} away first, then draw the wire.` };
  return { sheet: joinToNet(free, { part: part.id, pin }, net, newId), touched: [part.id] };
}

/** A part whose two pins lie opposite is turned round where it stands; any other has its pins moved. */
function swapPins(sheet: Sheet, part: PartRecord, [a, b]: readonly [string, string], newId: NewId): Taken {
  const [first, second] = [pinPlaceOf(part, a), pinPlaceOf(part, b)];
  if (!first || !second) return { refused: `${part.ref} has no pins ${a} and ${b}.` };
  if (first.x + second.x === 2 * part.x && first.y + second.y === 2 * part.y) {
    const swap = (end: WireEnd): WireEnd => (end.at === 'pin' && end.part === part.id ? { ...end, pin: end.pin === a ? b : end.pin === b ? a : end.pin } : end);
    const turned = withParts(sheet, (one) => (one === part ? { ...one, turn: turnedBy(one.turn, 2) } : one));
    return { sheet: { ...turned, wires: sheet.wires.map((wire) => ({ ...wire, a: swap(wire.a), b: swap(wire.b) })) }, touched: [part.id] };
  }
  const [onA, onB] = [a, b].map((pin) => heldWithout(sheet, { part: part.id, pin }));
  const moved = movePin(sheet, part, a, onB ?? null, newId);
  return 'refused' in moved ? moved : movePin(moved.sheet, part, b, onA ?? null, newId);
}

/** The net of a pin, held on to by its other pins. */
function heldWithout(sheet: Sheet, pin: PinName): HeldNet | null {
  const held = holdNet(sheet, netOfPin(sheet, pin) ?? '');
  return held && { ...held, pins: held.pins.filter((other) => other.part !== pin.part || other.pin !== pin.pin) };
}
