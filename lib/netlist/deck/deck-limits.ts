/** What a deck may be at most (`docs/architecture.md`, calls that run the engine). */
export const deckLimits = {
  bytes: 256 * 1024,
  lines: 5_000,
  /** Characters of a line with its continuations. */
  joinedLine: 4_096,
  /** Parts after all subcircuits are expanded. */
  parts: 1_000,
  /** Subcircuits inside one another. */
  depth: 8,
  /** Characters of an element, node, model or subcircuit name. */
  name: 40,
  /** Nodes of one element. */
  nodes: 64,
  /** Characters of a pin name of a box; longer ones are replaced by numbers. */
  pinName: 20,
  /** Characters of one fact. */
  fact: 2_000,
  /** Numbers of one source. */
  waveNumbers: 400,
} as const;
