import { commands, type CommandName } from './commands/command-list';

/** A key press, as the browser or a test tells it. */
export interface KeyPress {
  /** Key name as the DOM gives it: `Delete`, `ArrowLeft`, `,`, `z`. */
  readonly key: string;
  /** Ctrl, or Cmd on a Mac. */
  readonly mod?: boolean;
  readonly shift?: boolean;
  readonly alt?: boolean;
}

/** `Mod+Shift+Z` for a press; letters only ever with a modifier, so that no bare letter is a key. */
export function shortcutOf({ key, mod = false, shift = false, alt = false }: KeyPress): string | null {
  if (alt) return null;
  const letter = /^[a-z]$/i.test(key);
  if (letter && !mod) return null;
  const name = letter ? key.toUpperCase() : key;
  const shifted = shift && (letter || name.length > 1);
  return `${mod ? 'Mod+' : ''}${shifted ? 'Shift+' : ''}${mod && name === '+' ? '=' : name}`;
}

const byShortcut: ReadonlyMap<string, CommandName> = new Map(
  (Object.keys(commands) as CommandName[]).flatMap((name) => commands[name].keys.map((key) => [key, name] as const)),
);

/** Single keys are those without a modifier that a person can switch off: digits and signs, not Delete, Enter, Escape or arrows. */
const isSingle = (shortcut: string): boolean => shortcut.length === 1;

/** The command of a key press; undefined when it has none or single keys are switched off. */
export function commandOf(press: KeyPress, keysOn: boolean): CommandName | undefined {
  const shortcut = shortcutOf(press);
  if (shortcut === null || (!keysOn && isSingle(shortcut))) return undefined;
  return byShortcut.get(shortcut);
}
