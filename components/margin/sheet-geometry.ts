/**
 * What a margin entry is tied to. Parts by record id or by designator, nets by name, spots in sheet units. A designator with
 * `on` is tied to that net beside the transistor among `on.refs`, where there is one: a floating gate is shown at the gate.
 */
export type MarginAnchor =
  | { readonly kind: 'part'; readonly id: string }
  | { readonly kind: 'ref'; readonly ref: string; readonly on?: { readonly net: string; readonly refs: readonly string[] } }
  | { readonly kind: 'net'; readonly name: string }
  | { readonly kind: 'spot'; readonly x: number; readonly y: number };

/** CSS pixels from the left top of the canvas element. */
export interface Place {
  readonly x: number;
  readonly y: number;
}

export interface Box {
  readonly left: number;
  readonly top: number;
  readonly right: number;
  readonly bottom: number;
}

export interface Obstacles {
  readonly symbols: readonly Box[];
  readonly levelWires: readonly Box[];
}

export interface SheetTarget {
  /** Where a leader may end, the best first: pins or edges of a symbol, points of a wire. Never empty. */
  readonly ends: readonly Place[];
  /** Zone of the sheet's frame, 'B5'. */
  readonly zone: string;
  /** How the target is called: 'R1', 'net GATE', 'B5'. */
  readonly words: string;
}

/**
 * What the margin asks of a sheet canvas. The canvas makes one of these and keeps it for its life; every answer is about
 * the picture on the screen now.
 */
export interface SheetGeometry {
  /** Null when the anchor is not on the sheet any more. Places outside the visible canvas are given as they are. */
  targetOf(anchor: MarginAnchor): SheetTarget | null;
  /** Boxes of texts that a leader must not cross. */
  texts(): readonly Box[];
  /** Boxes that a leader had better leave alone: symbols, and the room along level wires. */
  obstacles(): Obstacles;
  /** Visible size of the canvas. */
  size(): { readonly width: number; readonly height: number };
  /** Called after each frame that moved something: pan, zoom, drag, edit, resize. Returns how to stop. */
  subscribe(listener: () => void): () => void;
  /** Sheet units of a free spot in the middle of the view, where a new note may stand. */
  spotInView(): Place;
  /** Brings what is anchored into view. */
  reveal(anchor: MarginAnchor): void;
}
