import { copyItems } from '../edits/clip';
import { hasSelection, type Command } from './command';

export const copy: Command = {
  name: 'copy', title: 'Copy', group: 'Edit', keys: ['Mod+C'], edits: false,
  when: hasSelection,
  perform: ({ state }) => {
    const clip = copyItems(state.sheet, state.selection);
    return clip ? { clip } : { refused: 'Choose a part to copy; a wire goes with the parts it joins.' };
  },
};
