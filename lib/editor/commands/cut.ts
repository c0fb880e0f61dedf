import { copyItems } from '../edits/clip';
import { deleteItems } from '../edits/delete-items';
import { hasSelection, type Command } from './command';

export const cut: Command = {
  name: 'cut', title: 'Cut', group: 'Edit', keys: ['Mod+X'], edits: true,
  when: hasSelection,
  perform: ({ state, newId }) => {
    const clip = copyItems(state.sheet, state.selection);
    if (!clip) return { refused: 'Choose a part to cut; a wire goes with the parts it joins.' };
    return { clip, sheet: deleteItems(state.sheet, state.selection, newId), selection: new Set() };
  },
};
