import { kindIds, type KindId } from '../kinds/kind-id';

/** Other words of a deck for our kinds and for those that are labels as yet. */
const otherWords: ReadonlyMap<string, string> = new Map([['lead', 'removable-lead'], ['gpio', 'controller-pin'], ['plug', 'plug-contact']]);

/** The kind that `kind=` names, in any case; undefined for a label. */
export function kindOfWord(word: unknown): KindId | undefined {
  const canonical = canonicalKindWord(word);
  return kindIds.find((id) => id === canonical && id !== 'box');
}

/** The one spelling of a kind word: lower case, `lead` and `GPIO` under the names of their kinds; a label of another kind as written. */
export function canonicalKindWord(word: unknown): string | undefined {
  if (typeof word !== 'string') return undefined;
  const lower = word.toLowerCase();
  const known = otherWords.get(lower) ?? lower;
  return laterKinds.has(known) || kindIds.some((id) => id === known) ? known : word;
}

/** Kinds that decks name and that have no folder of their own yet. */
const laterKinds: ReadonlySet<string> = new Set([
  'lamp', 'relay', 'controller-pin', 'open-drain-gpio', 'opto-led', 'opto-transistor', 'earth',
]);
