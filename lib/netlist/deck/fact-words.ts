import type { FactValue } from '../netlist';
import { deckNumber } from './deck-number';

/** Longest fact line that is written; longer lists go on with another line of the same name. */
const longestLine = 400;

/** Fact lines of one name, values that read back as the same: words with spaces in quotes, a note on a line of its own at the end. */
export function factLines(name: string, facts: Readonly<Record<string, FactValue | undefined>>): string[] {
  const { note, ...others } = facts;
  const lines: string[] = [];
  let line = '';
  for (const [key, value] of Object.entries(others)) {
    if (value === undefined) continue;
    const words = `${key}=${factWord(value)}`;
    if (line !== '' && line.length + words.length > longestLine) {
      lines.push(line);
      line = '';
    }
    line += ` ${words}`;
  }
  if (line !== '') lines.push(line);
  if (note !== undefined) lines.push(` note=${oneLine(String(note)).trim()}`);
  return lines.map((words) => `*@${name}${words}`);
}

function factWord(value: FactValue): string {
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  if (typeof value === 'number') return deckNumber(value);
  if (typeof value !== 'string') return `${deckNumber(value[0])}..${deckNumber(value[1])}`;
  const text = oneLine(value);
  const isPlain = /^[^\s"\\;]+$/.test(text);
  return isPlain ? text : `"${text.replace(/["\\]/g, '\\$&')}"`;
}

/** Control characters cannot stand in a line of a deck. */
function oneLine(text: string): string {
  return text.replace(/\p{Cc}+/gu, ' ');
}
