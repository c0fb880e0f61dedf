/**
 * How a fact is typed and shown.
 * - `quantity`: a number in SI units, stated in `unit`.
 * - `flag`: yes or no. With a unit a number is taken as well: it says yes and how much (`fuse=2`).
 * - `label`: a word or a few, kept as written.
 * - `range`: two numbers in `unit`, written `a..b`.
 */
export type FactType = 'quantity' | 'flag' | 'label' | 'range';

export interface FactDefinition {
  /** Words of a form field, without the unit. */
  readonly label: string;
  /** SI unit symbol as printed (`V`, `Ω`, `K/W`); '' for pure numbers and labels. */
  readonly unit: string;
  readonly type: FactType;
  /** Inclusive bounds in SI units. Outside them a typed quantity is refused; a deck's is kept with a notice. */
  readonly min?: number;
  readonly max?: number;
  /** Words a label may have; others are kept as written. */
  readonly choices?: readonly string[];
}

export function quantity(label: string, unit: string, min: number, max: number): FactDefinition {
  return { label, unit, type: 'quantity', min, max };
}

export function flag(label: string, unit = ''): FactDefinition {
  return { label, unit, type: 'flag' };
}

export function label(words: string, choices?: readonly string[]): FactDefinition {
  return choices ? { label: words, unit: '', type: 'label', choices } : { label: words, unit: '', type: 'label' };
}
