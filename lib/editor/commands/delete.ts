import { deleteItems } from '../edits/delete-items';
import { hasSelection, type Command } from './command';

export const deleteSelection: Command = {
  name: 'delete', title: 'Delete', group: 'Edit', keys: ['Delete', 'Backspace'], edits: true,
  when: hasSelection,
  perform: ({ state, newId }) => ({ sheet: deleteItems(state.sheet, state.selection, newId), selection: new Set() }),
};
