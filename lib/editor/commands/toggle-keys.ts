import { always, type Command } from './command';

/** Switches the sheet's single keys (digits, comma, full stop, minus) off and on; keys with Ctrl or Cmd stay. */
export const toggleKeys: Command = {
  name: 'toggle-keys', title: 'Single keys on or off', group: 'View', keys: ['Mod+Shift+K'], edits: false,
  when: always,
  perform: ({ state }) => ({ keysOn: !state.keysOn, message: state.keysOn ? 'Single keys are off. Ctrl+Shift+K turns them on.' : 'Single keys are on.' }),
};
