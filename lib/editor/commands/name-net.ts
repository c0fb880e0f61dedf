import { samePoint, snapPoint, type Point } from '@/lib/document/geometry/point';
import { pinPlacesOf } from '@/lib/document/geometry/pin-place';
import type { Turn } from '@/lib/document/geometry/turn';
import { addPart, newPart } from '../edits/add-part';
import { withParts } from '../edits/edit';
import { always, type Command } from './command';

const form = /^[^\p{Cc}]{1,40}$/u;

/** Why a net cannot be called so; null when it can. */
export const refusedNetName = (name: string): string | null =>
  form.test(name.trim()) ? null : 'A net name is one line of 1 to 40 characters.';

/** Names the net at a place; a name that stands there already is changed. Nets of equal names are one. */
export const nameNet: Command<{ readonly at: Point; readonly name: string }> = {
  name: 'name-net', title: 'Name a net', group: 'Wires and nets', keys: [], edits: true,
  when: always,
  perform: ({ state: { sheet }, newId }, { at, name: typed }) => {
    const refused = refusedNetName(typed);
    if (refused) return { refused };
    const [name, place] = [typed.trim(), snapPoint(at)];
    const known = sheet.parts.find((part) => part.kind === 'net-name' && samePoint(part, place));
    if (known) return { sheet: withParts(sheet, (part) => (part === known ? { ...part, facts: { ...part.facts, name } } : part)), selection: new Set([known.id]) };
    const pin = sheet.parts.flatMap(pinPlacesOf).find((one) => samePoint(one, place));
    const turn: Turn = !pin || pin.out.x > 0 ? 0 : pin.out.x < 0 ? 180 : pin.out.y < 0 ? 270 : 90;
    const mark = newPart(sheet, 'net-name', { ...place, turn, mirror: false }, newId(), { name });
    return { sheet: addPart(sheet, mark, newId), selection: new Set([mark.id]) };
  },
};
