import { always, type Command } from './command';

/** Shows a lead or plug lifted, or put back. A way of looking at the sheet: nothing is edited. */
export const liftLead: Command<{ readonly ref: string }> = {
  name: 'lift-lead', title: 'Lift a lead', group: 'Wires and nets', keys: [], edits: false,
  when: always,
  perform: ({ state }, { ref }) => {
    const lead = state.sheet.parts.some((part) => part.ref === ref && (part.kind === 'removable-lead' || part.kind === 'plug-contact'));
    if (!lead) return { refused: `${ref} is no lead or plug. Only these are lifted.` };
    const lifted = new Set(state.lifted);
    if (!lifted.delete(ref)) lifted.add(ref);
    return { lifted, message: lifted.has(ref) ? `${ref} is shown lifted.` : `${ref} is plugged in again.` };
  },
};
