import type { DeckDocument, DeckError, DeckReading } from './deck-document';
import { deckLines } from './deck-lines';
import { DeckRefusal } from './deck-refusal';
import { readFactLine } from './read-fact-line';
import { checkSubcircuits } from './check-subcircuits';
import { StatementReader } from './statement-reader';

/** Most errors that are told at once. */
const maxErrors = 20;

/**
 * Reads a SPICE deck with fact lines (`docs/rules.md`, "Reader"). Answers the document, or every line that cannot be
 * read with the reason. Takes a time that grows with the length of the text and no faster.
 */
export function readDeck(text: string): DeckReading {
  try {
    return read(text);
  } catch (error) {
    if (error instanceof DeckRefusal) return { ok: false, errors: [{ line: error.line, reason: error.reason }] };
    throw error;
  }
}

function read(text: string): DeckReading {
  const { title, statements, facts } = deckLines(text);
  const reader = new StatementReader();
  const errors: DeckError[] = [];
  const refuse = (error: unknown) => {
    if (!(error instanceof DeckRefusal)) throw error;
    errors.push({ line: error.line, reason: error.reason });
  };
  const attempt = (step: () => void) => {
    try {
      step();
    } catch (error) {
      refuse(error);
    }
  };
  for (const statement of statements) attempt(() => reader.readParam(statement));
  for (const statement of statements) attempt(() => reader.readStatement(statement));
  attempt(() => reader.checkClosed());
  reader.readElements(refuse);
  if (errors.length > 0) return { ok: false, errors: errors.sort((a, b) => a.line - b.line).slice(0, maxErrors) };
  const { elements, models, subcircuits } = reader.root.subcircuit();
  const factLines = facts.flatMap((line) => readFactLine(line, reader.notices) ?? []);
  const document: DeckDocument = {
    title, elements, models, subcircuits, factLines,
    params: Object.fromEntries(reader.params), options: reader.options,
    ...(reader.temp === undefined ? {} : { temp: reader.temp }),
    notices: reader.notices.sort((a, b) => a.line - b.line),
  };
  checkSubcircuits(document);
  return { ok: true, document };
}
