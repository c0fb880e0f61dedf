import { byCodeUnit } from '../designators/designator';
import type { DeckElement, ModelCard, Netlist, NetlistPart, Subcircuit } from '../netlist';
import type { DeckDocument } from './deck-document';
import { nameKey } from './names';

/** Cards and subcircuits of a deck that its parts use, directly or inside one another; what nothing uses says nothing. */
export function libraryOf(document: DeckDocument, parts: readonly NetlistPart[]): Pick<Netlist, 'models' | 'subcircuits'> {
  const subcircuits = reachable(document.subcircuits, parts.filter(({ kind }) => kind === 'box').flatMap(({ model }) => model ?? []));
  const used = new Set([...parts.flatMap(({ model }) => model ?? []), ...subcircuits.flatMap(modelNames)].map(nameKey));
  return {
    models: document.models.filter((card: ModelCard) => used.has(nameKey(card.name))).sort((a, b) => byCodeUnit(a.name, b.name)),
    subcircuits: [...subcircuits].sort((a, b) => byCodeUnit(a.name, b.name)),
  };
}

function reachable(all: readonly Subcircuit[], names: readonly string[]): readonly Subcircuit[] {
  const found = new Set<Subcircuit>();
  const visit = (name: string) => {
    const subcircuit = all.find((candidate) => nameKey(candidate.name) === nameKey(name));
    if (!subcircuit || found.has(subcircuit)) return;
    found.add(subcircuit);
    for (const called of modelNames(subcircuit)) visit(called);
  };
  for (const name of names) visit(name);
  return all.filter((subcircuit) => found.has(subcircuit));
}

/** Names of cards and subcircuits that the inside of a subcircuit uses. */
function modelNames(subcircuit: Subcircuit): string[] {
  return [...subcircuit.elements.flatMap((element: DeckElement) => element.model ?? []), ...subcircuit.subcircuits.flatMap(modelNames)];
}
