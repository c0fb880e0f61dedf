import { deckLimits } from './deck-limits';
import { DeckRefusal } from './deck-refusal';

/** One statement of a deck: its lines joined, comments gone. */
export interface DeckLine {
  readonly text: string;
  /** Line of the file at which it starts, from 1. */
  readonly line: number;
}

export interface DeckLines {
  readonly title: string;
  readonly statements: readonly DeckLine[];
  /** `*@` lines without their mark, untouched otherwise. */
  readonly facts: readonly DeckLine[];
}

/** Splits a deck into title, statements and fact lines. Throws `DeckRefusal` on what passes the limits. */
export function deckLines(text: string): DeckLines {
  if (new TextEncoder().encode(text).length > deckLimits.bytes) {
    throw new DeckRefusal(1, `The deck is larger than ${deckLimits.bytes / 1024} KiB.`);
  }
  const lines = text.replace(/^\ufeff/, '').split(/\r\n|\r|\n/);
  if (lines.length > deckLimits.lines + 1) throw new DeckRefusal(deckLimits.lines + 1, `The deck has more than ${deckLimits.lines} lines.`);
  const statements: { text: string; line: number }[] = [];
  const facts: DeckLine[] = [];
  for (const [index, raw] of lines.entries()) {
    const line = index + 1;
    if (hasControlCharacter(raw)) throw new DeckRefusal(line, 'The line has a control character in it.');
    if (raw.length > deckLimits.joinedLine) throw tooLong(line);
    if (index === 0) continue;
    const trimmed = raw.trim();
    if (trimmed.startsWith('*@')) facts.push({ text: trimmed.slice(2).trim(), line });
    else if (!trimmed.startsWith('*')) addStatement(statements, withoutComment(trimmed), line);
    if (/^\.end$/i.test(trimmed)) break;
  }
  return { title: (lines[0] as string).trim(), statements, facts };
}

function addStatement(statements: { text: string; line: number }[], text: string, line: number): void {
  if (text === '') return;
  if (!text.startsWith('+')) {
    statements.push({ text, line });
    return;
  }
  const last = statements.at(-1);
  if (!last) throw new DeckRefusal(line, 'A line that starts with + continues the one before, and there is none.');
  last.text = `${last.text} ${text.slice(1).trim()}`;
  if (last.text.length > deckLimits.joinedLine) throw tooLong(last.line);
}

function tooLong(line: number): DeckRefusal {
  return new DeckRefusal(line, `The line with its continuations is longer than ${deckLimits.joinedLine} characters.`);
}

/** Cuts at `;` and at a `$` that stands before a space or the end of the line. */
function withoutComment(text: string): string {
  for (let index = 0; index < text.length; index++) {
    const dollar = text[index] === '$' && (index + 1 === text.length || /\s/.test(text[index + 1] as string));
    if (text[index] === ';' || dollar) return text.slice(0, index).trimEnd();
  }
  return text;
}

function hasControlCharacter(text: string): boolean {
  for (let index = 0; index < text.length; index++) {
    const code = text.charCodeAt(index);
    if ((code < 0x20 && code !== 0x09) || code === 0x7f) return true;
  }
  return false;
}
