import { refusedRef } from '../edits/designators';
import { withParts } from '../edits/edit';
import { always, type Command } from './command';

/** Changes a designator. Designators are unique; contacts of one plug share theirs, and are renamed together. */
export const renamePart: Command<{ readonly part: string; readonly ref: string; readonly alone?: boolean }> = {
  name: 'rename-part', title: 'Change the designator', group: 'Parts', keys: [], edits: true,
  when: always,
  perform: ({ state: { sheet } }, { part: id, ref: typed, alone = false }) => {
    const part = sheet.parts.find((one) => one.id === id);
    if (!part) return { refused: 'That part is no longer on the sheet.' };
    const ref = typed.trim();
    const refused = refusedRef(sheet, part, ref);
    if (refused) return { refused };
    const together = (one: typeof part) => one === part || (!alone && part.kind === 'plug-contact' && one.kind === part.kind && one.ref === part.ref);
    return { sheet: withParts(sheet, (one) => (together(one) && one.ref !== ref ? { ...one, ref } : one)) };
  },
};
