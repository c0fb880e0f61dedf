import { snapPoint, type Point } from '@/lib/document/geometry/point';
import type { KindId } from '@/lib/netlist/kinds/kind-id';
import { always, type Command } from './command';

/** Takes a part from the drawer: it follows the pointer, or the cursor keys, until it is put down. */
export const holdPart: Command<{ readonly kind: KindId; readonly at?: Point }> = {
  name: 'hold-part', title: 'Take a part from the drawer', group: 'Parts', keys: [], edits: true,
  when: always,
  perform: ({ state }, { kind, at }) => {
    const place = snapPoint(at ?? state.cursor);
    return { tool: 'add', cursor: place, ghost: { kind, at: place, turn: 0, mirror: false } };
  },
};
