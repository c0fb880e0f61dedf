import { snapPoint, type Point } from '@/lib/document/geometry/point';
import { newPart } from '../edits/add-part';
import { always, type Command } from './command';

/** Writes a note on the sheet: words for whoever builds it, no part of the netlist. */
export const placeNote: Command<{ readonly at: Point; readonly text: string }> = {
  name: 'place-note', title: 'Write a note', group: 'Parts', keys: [], edits: true,
  when: always,
  perform: ({ state: { sheet }, newId }, { at, text: typed }) => {
    const text = typed.trim();
    if (text === '' || text.length > 500) return { refused: 'A note has 1 to 500 characters.' };
    const note = newPart(sheet, 'note', { ...snapPoint(at), turn: 0, mirror: false }, newId(), { text });
    return { sheet: { ...sheet, parts: [...sheet.parts, note] }, selection: new Set([note.id]) };
  },
};
