/** Generated names of one deck: nothing that a person typed reaches the engine. */
export class EngineNames {
  readonly #nodes = new Map<string, string>([['0', '0']]);
  readonly #given = new Map<string, string>();

  /** Node of a key; `0` stays `0`. `shown` is what a refusal calls it. */
  node(key: string, shown = key): string {
    const known = this.#nodes.get(key);
    if (known !== undefined) return known;
    const name = `n${this.#nodes.size}`;
    this.#nodes.set(key, name);
    this.#given.set(name, shown);
    return name;
  }

  /** What people call the nodes that ngspice names in its messages. */
  named(messages: readonly string[]): readonly string[] {
    const words = messages.join(' ').match(/\bn\d+\b/g) ?? [];
    return [...new Set(words.flatMap((word) => this.#given.get(word) ?? []))];
  }
}
