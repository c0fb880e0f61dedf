import type { CollectionName } from '../stored-sheet';

/** How many records one sheet may hold: the deck reader's ceiling of 1,000 parts, a 0 V symbol or net name at each of their pins, notes. */
export const recordLimits: Readonly<Record<CollectionName, number>> = {
  parts: 12_000, wires: 16_000, junctions: 16_000, scenarios: 60, holdPoints: 60,
};

/** Parts with a designator on one sheet: what a deck may bring, and a page can check while it is drawn on. */
export const partsLimit = 1_000;

/** Model cards and subcircuits of one sheet's library. */
export const libraryLimit = 1_000;

/** Bytes of one record as JSON. */
export const recordBytesLimit = 64 * 1_024;

/** Encoded bytes of a whole document: from the first on people are told, at the second edits are refused (`docs/realtime.md`, element 7). */
export const documentSoftBytes = 5 * 1_024 * 1_024;
export const documentHardBytes = 20 * 1_024 * 1_024;

/**
 * Bytes of one edit. A page's edits are held to a frame of 1 MiB before they come here; a deck of 1,000 parts, brought over
 * HTTP as one edit, is about that size and may be larger with its facts.
 */
export const updateBytesLimit = 4 * 1_024 * 1_024;
