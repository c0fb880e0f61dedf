import { commands } from '../commands/command-list';
import type { EditorState } from '../editor-state';
import { spokenItems } from './part-spoken';

/** What the tool in hand waits for, in one line for the status strip; null when there is nothing to say. */
export function toolHint({ tool, gesture, ghost, selection, sheet, readOnly }: EditorState): string | null {
  if (gesture.doing === 'wiring') return `Wire from ${gesture.from}: click or Enter bends, Esc ends`;
  if (gesture.doing === 'asking') return 'Enter keeps, Esc goes back';
  if (ghost) return 'Click or Enter puts it down, , and . turn, - mirrors, Esc goes back';
  switch (tool) {
    case 'wire': return 'Wire: press a pin, a wire or an empty place';
    case 'net-name': return 'Net name: press the pin or wire to name';
    case 'note': return 'Note: press where it should stand';
    case 'lift': return 'Lift lead: press a removable lead or a plug';
    case 'add': return 'Choose a part in the drawer';
    case 'select': break;
  }
  if (selection.size === 0) return null;
  const [id, ...more] = selection;
  if (more.length > 0) return `${selection.size} selected`;
  const ref = sheet.parts.find((part) => part.id === id)?.ref;
  if (!ref) return null;
  return readOnly ? `${ref} selected` : `${ref} selected: ${commands['turn-left'].keys[0]} ${commands['turn-right'].keys[0]} turn, ${commands.mirror.keys[0]} mirrors`;
}

/** What the pointer is over: `R2, 10 kΩ, from GATE to 0 V` or the net of a wire; null over nothing. */
export function hoverWords({ hover, sheet }: EditorState): string | null {
  if (!hover) return null;
  const spoken = spokenItems(sheet);
  switch (hover.on) {
    case 'part': case 'pin': return spoken.get(hover.part) ?? null;
    case 'wire': case 'corner': return spoken.get(hover.wire)?.replace(/^Wire, ([nu])/, (_, first: string) => first.toUpperCase()) ?? null;
    default: return null;
  }
}
