import { snapPoint, type Point } from '@/lib/document/geometry/point';
import { addWire } from '../edits/add-wire';
import { always, type Command } from './command';

/** Draws a wire from one place to another by the corners given. A place on a wire joins it. */
export const drawWire: Command<{ readonly from: Point; readonly to: Point; readonly bends?: readonly Point[] }> = {
  name: 'draw-wire', title: 'Draw a wire', group: 'Wires and nets', keys: [], edits: true,
  when: always,
  perform: ({ state, newId }, { from, to, bends = [] }) => {
    const corners = bends.map(snapPoint).map(({ x, y }): [number, number] => [x, y]);
    return { sheet: addWire(state.sheet, snapPoint(from), corners, snapPoint(to), newId) };
  },
};
