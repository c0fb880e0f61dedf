import { snapPoint, type Point } from '@/lib/document/geometry/point';
import type { WireEnd } from '@/lib/document/records';
import { splitWire } from '../edits/split-wire';
import { tidyWiring } from '../edits/tidy-wiring';
import { endAt, wireThrough } from '../edits/wire-target';
import { always, type Command } from './command';

/** Joins what crosses or touches at a place: wires that merely pass become one net with a junction, or with the pin there. */
export const join: Command<{ readonly at: Point }> = {
  name: 'join', title: 'Join here', group: 'Wires and nets', keys: [], edits: true,
  when: always,
  perform: ({ state: { sheet }, newId }, { at }) => {
    const place = snapPoint(at);
    const there = endAt(sheet, place);
    const junction = { id: newId(), ...place };
    const end: WireEnd = there ?? { at: 'junction', junction: junction.id };
    let current = there ? sheet : { ...sheet, junctions: [...sheet.junctions, junction] };
    let cuts = 0;
    for (let wire = wireThrough(current, place); wire !== undefined; wire = wireThrough(current, place)) {
      current = splitWire(current, wire, place, end, newId);
      cuts += 1;
    }
    if (cuts + (there ? 1 : 0) < 2) return { refused: 'Nothing crosses here that could be joined.' };
    return { sheet: tidyWiring(current) };
  },
};
