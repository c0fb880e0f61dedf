import { snapPoint, type Point } from '@/lib/document/geometry/point';
import type { Turn } from '@/lib/document/geometry/turn';
import type { PartRecord } from '@/lib/document/records';
import type { KindId } from '@/lib/netlist/kinds/kind-id';
import { addPart, newPart } from '../edits/add-part';
import { always, type Command } from './command';

interface Placing {
  readonly kind: KindId;
  readonly at: Point;
  readonly turn?: Turn;
  readonly mirror?: boolean;
  readonly facts?: PartRecord['facts'];
}

/** Puts a part on the grid. Its pins join the wires and pins they come to lie on. */
export const placePart: Command<Placing> = {
  name: 'place-part', title: 'Place a part', group: 'Parts', keys: [], edits: true,
  when: always,
  perform: ({ state, newId }, { kind, at, turn = 0, mirror = false, facts = {} }) => {
    if (kind === 'box') return { refused: 'A part that is not examined comes with a deck only.' };
    const part = newPart(state.sheet, kind, { ...snapPoint(at), turn, mirror }, newId(), facts);
    return { sheet: addPart(state.sheet, part, newId), selection: new Set([part.id]) };
  },
};
