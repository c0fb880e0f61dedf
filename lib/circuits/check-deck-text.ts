import { checkDeck, type DeckReport } from '@/lib/check/check-deck';
import { Problem } from '@/lib/errors/problem';
import { checkEngine } from '@/lib/review/check-engine';
import { withinPatience } from '@/lib/review/check-on-server';
import { readDeckText } from './read-deck-text';

/** Checks a deck and stores nothing. A deck that cannot be read is refused with line and reason. */
export async function checkDeckText(deck: string): Promise<DeckReport> {
  readDeckText(deck);
  const { report, readable } = await withinPatience(checkDeck(deck, checkEngine()));
  if (!readable) throw new Problem('deck-unreadable');
  return report;
}
