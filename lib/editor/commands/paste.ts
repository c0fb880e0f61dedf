import { partsLimit } from '@/lib/document/admission/sheet-limits';
import { gridUnit } from '@/lib/document/records';
import { pasteClip, type Clip } from '../edits/clip';
import { always, type Command } from './command';

/** Puts the clip, or the one handed over, beside where it was taken from. */
export const paste: Command<{ readonly clip?: Clip } | void> = {
  name: 'paste', title: 'Paste', group: 'Edit', keys: ['Mod+V'], edits: true,
  when: always,
  perform: ({ state, clip: kept, newId }, args) => {
    const clip = args?.clip ?? kept;
    if (!clip) return { refused: 'There is nothing to paste. Copy a part first.' };
    const parts = [...state.sheet.parts, ...clip.parts].filter((part) => part.ref !== '').length;
    if (parts > partsLimit) return { refused: `With what is pasted the sheet would have ${parts} parts; it takes ${partsLimit}. Paste less, or on a sheet of its own.` };
    const { sheet, pasted } = pasteClip(state.sheet, clip, 2 * gridUnit, 2 * gridUnit, newId);
    const shifted: Clip = {
      ...clip,
      parts: clip.parts.map((part) => ({ ...part, x: part.x + 2 * gridUnit, y: part.y + 2 * gridUnit })),
      wires: clip.wires.map((wire) => ({ ...wire, bends: wire.bends.map(([x, y]): [number, number] => [x + 2 * gridUnit, y + 2 * gridUnit]) })),
      junctions: clip.junctions.map((junction) => ({ ...junction, x: junction.x + 2 * gridUnit, y: junction.y + 2 * gridUnit })),
    };
    return { sheet, selection: pasted, clip: shifted };
  },
};
