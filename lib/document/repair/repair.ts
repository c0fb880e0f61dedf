import type { CollectionName } from '../stored-sheet';

/** Something in the stored sheet that a reader does without. The stored document itself is left as it is. */
export interface Repair {
  readonly collection: CollectionName | 'library';
  readonly id: string;
  readonly reason: string;
}

export interface Repaired<T> {
  readonly kept: readonly T[];
  readonly repairs: readonly Repair[];
}
