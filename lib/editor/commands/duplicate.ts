import { gridUnit } from '@/lib/document/records';
import { copyItems, pasteClip } from '../edits/clip';
import { hasSelection, type Command } from './command';

export const duplicate: Command = {
  name: 'duplicate', title: 'Duplicate', group: 'Edit', keys: ['Mod+D'], edits: true,
  when: hasSelection,
  perform: ({ state, newId }) => {
    const clip = copyItems(state.sheet, state.selection);
    if (!clip) return { refused: 'Choose a part to duplicate; a wire goes with the parts it joins.' };
    const { sheet, pasted } = pasteClip(state.sheet, clip, 2 * gridUnit, 2 * gridUnit, newId);
    return { sheet, selection: pasted };
  },
};
