import { snapPoint, type Point } from '@/lib/document/geometry/point';
import { dragCorner, dragSegment } from '../edits/drag-line';
import { tidyWiring } from '../edits/tidy-wiring';
import { always, type Command } from './command';

/** Shifts a run or a corner of a wire. Corners set so stay where a person put them. */
export const dragLine: Command<{ readonly wire: string; readonly to: Point } & ({ readonly segment: number } | { readonly corner: number })> = {
  name: 'drag-line', title: 'Shift a bend', group: 'Wires and nets', keys: [], edits: true,
  when: always,
  perform: ({ state: { sheet } }, args) => {
    const to = snapPoint(args.to);
    return { sheet: tidyWiring('segment' in args ? dragSegment(sheet, args.wire, args.segment, to) : dragCorner(sheet, args.wire, args.corner, to)) };
  },
};
