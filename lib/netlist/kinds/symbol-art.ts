/** Drawing of a symbol about its origin, y downwards, in sheet units. Classes: s stroke, b stroke with film body, k ink fill, h heavy stroke, d dashed. */
export interface SymbolArt {
  /** Id on the symbol plate. Names a drawing only. */
  readonly id: string;
  readonly shapes: readonly SymbolShape[];
  /** Left, top, right, bottom. */
  readonly box: readonly [number, number, number, number];
}

export type SymbolClass = 's' | 'b' | 'k' | 'h' | 'd';

export type SymbolShape =
  | { readonly shape: 'path'; readonly style: SymbolClass; readonly d: string }
  | { readonly shape: 'circle'; readonly style: SymbolClass; readonly cx: number; readonly cy: number; readonly r: number }
  | { readonly shape: 'text'; readonly x: number; readonly y: number; readonly anchor: 'start' | 'middle' | 'end'; readonly text: string };
