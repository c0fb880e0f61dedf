import { snapPoint, type Point } from '@/lib/document/geometry/point';
import { indexOf } from '@/lib/document/geometry/sheet-index';
import { wirePath } from '@/lib/document/geometry/wire-path';
import { gridUnit } from '@/lib/document/records';
import { segmentAt, splitWire as cut } from '../edits/split-wire';
import { tidyWiring } from '../edits/tidy-wiring';
import { always, type Command } from './command';

/** Cuts a wire in two at a place: both pieces end loose, two grid steps apart. */
export const splitWire: Command<{ readonly wire: string; readonly at: Point }> = {
  name: 'split-wire', title: 'Cut a wire', group: 'Wires and nets', keys: [], edits: true,
  when: always,
  perform: ({ state: { sheet }, newId }, { wire: id, at }) => {
    const index = indexOf(sheet);
    const wire = index.wire.get(id);
    const path = wire ? wirePath(index, wire) : [];
    const place = snapPoint(at);
    const segment = segmentAt(path, place);
    const [a, b] = [path[segment], path[segment + 1]];
    if (!wire || !a || !b) return { refused: 'There is no wire to cut here.' };
    const step = { x: Math.sign(b.x - a.x) * gridUnit, y: Math.sign(b.y - a.y) * gridUnit };
    const [near, far] = [{ x: place.x - step.x, y: place.y - step.y }, { x: place.x + step.x, y: place.y + step.y }];
    if (segmentAt(path, near) < 0 || segmentAt(path, far) < 0) return { refused: 'This piece is too short to cut. Delete it instead.' };
    const [one, two] = [{ id: newId(), ...near }, { id: newId(), ...far }];
    const open = { ...sheet, junctions: [...sheet.junctions, one, two] };
    const first = cut(open, id, near, { at: 'junction', junction: one.id }, newId);
    const rest = first.wires.find((other) => other.id !== id && other.a.at === 'junction' && other.a.junction === one.id);
    const second = rest ? cut(first, rest.id, far, { at: 'junction', junction: two.id }, newId) : first;
    return { sheet: tidyWiring({ ...second, wires: second.wires.filter((other) => other.id !== rest?.id) }) };
  },
};
