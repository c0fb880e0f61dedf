import type { DeckElement, ModelCard, Subcircuit } from '../netlist';
import type { DeckLine } from './deck-lines';
import { nameKey } from './names';

/** The deck itself or the inside of a `.subckt` while it is being read. */
export class DeckScope {
  readonly models = new Map<string, ModelCard>();
  readonly inside: DeckScope[] = [];
  /** Element statements, read once all models are known: a card may stand below its elements. */
  readonly pending: DeckLine[] = [];
  readonly elements: DeckElement[] = [];

  constructor(
    readonly name: string,
    readonly pins: readonly string[],
    readonly line: number,
    readonly parent: DeckScope | undefined,
  ) {}

  /** A card of this scope or of one around it. */
  model(key: string): ModelCard | undefined {
    return this.models.get(key) ?? this.parent?.model(key);
  }

  hasInside(name: string): boolean {
    return this.inside.some((scope) => nameKey(scope.name) === nameKey(name));
  }

  get depth(): number {
    return this.parent ? this.parent.depth + 1 : 0;
  }

  subcircuit(): Subcircuit {
    return {
      name: this.name, pins: this.pins, elements: this.elements, models: [...this.models.values()],
      subcircuits: this.inside.map((scope) => scope.subcircuit()),
    };
  }
}
