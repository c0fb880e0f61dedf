import type { StoredSheet } from '../stored-sheet';

/** A step between two layouts of the stored sheet. Pure; `down(up(x))` keeps what the older layout can say. */
export interface Migration {
  /** Layout version that `up` arrives at; `down` goes back to one less. */
  readonly version: number;
  readonly title: string;
  up(stored: StoredSheet): StoredSheet;
  down(stored: StoredSheet): StoredSheet;
}

/** Every step since layout 1, in order. Layout 1 is the first, so the list starts empty. */
export const migrations: readonly Migration[] = [];
