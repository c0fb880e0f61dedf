import { canonicalJson } from '../hash';
import { kindOf } from '../kinds/kind-registry';
import type { DeckElement, ModelCard, NetlistPart, Wave } from '../netlist';
import { readDeck } from './read-deck';

/**
 * The part without a model or a wave that its own facts would give in a written deck: such a card says nothing new, and the part
 * stays the one that was written (`docs/rules.md`, "Designators").
 */
export function withoutRestated<T extends Omit<NetlistPart, 'id'>>(part: T, element: DeckElement, card: ModelCard | undefined): T {
  if (element.letter === 'V' && part.wave) return withoutWave(part, element);
  if ((element.letter === 'D' || element.letter === 'Q') && card) return withoutModel(part, element, card);
  return part;
}

function withoutWave<T extends Omit<NetlistPart, 'id'>>(part: T, element: DeckElement): T {
  const { wave, ...bare } = part;
  const [written] = writtenAgain(bare as T, element)?.elements ?? [];
  return wave && isSameWave(written?.wave, wave) ? (bare as T) : part;
}

/** Numbers that differ by no more than arithmetic does; missing ones at the end are 0. */
function isSameWave(a: Wave | undefined, b: Wave): boolean {
  if (a?.shape !== b.shape) return false;
  const length = Math.max(a.args.length, b.args.length);
  return Array.from({ length }, (_, index) => [a.args[index] ?? 0, b.args[index] ?? 0] as const)
    .every(([left, right]) => Math.abs(left - right) <= 1e-9 * Math.max(Math.abs(left), Math.abs(right)));
}

function withoutModel<T extends Omit<NetlistPart, 'id'>>(part: T, element: DeckElement, card: ModelCard): T {
  const { model: _model, ...bare } = part;
  const [written] = writtenAgain(bare as T, element)?.models ?? [];
  const says = (known: ModelCard | undefined) => known && canonicalJson([known.type, known.params, known.flags]);
  return says(written) === says(card) ? (bare as T) : part;
}

function writtenAgain(part: Omit<NetlistPart, 'id'>, element: DeckElement) {
  const lines = kindOf(part.kind).deck.write({ ...part, id: '' }, element.name, (net) => net);
  const reading = readDeck(['again', ...lines].join('\n'));
  return reading.ok ? reading.document : undefined;
}
