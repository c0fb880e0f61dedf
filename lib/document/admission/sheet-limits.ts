import type { CollectionName } from '../stored-sheet';

/** How many records one sheet may hold: the deck reader's ceiling of 1,000 parts with room for marks and notes. */
export const recordLimits: Readonly<Record<CollectionName, number>> = {
  parts: 4_000, wires: 8_000, junctions: 8_000, scenarios: 50, holdPoints: 40,
};

/** Model cards and subcircuits of one sheet's library. */
export const libraryLimit = 1_000;

/** Bytes of one record as JSON. */
export const recordBytesLimit = 64 * 1_024;

/** Encoded bytes of a whole document: from the first on people are told, at the second edits are refused (`docs/realtime.md`, element 7). */
export const documentSoftBytes = 5 * 1_024 * 1_024;
export const documentHardBytes = 20 * 1_024 * 1_024;

/** Bytes of one edit. */
export const updateBytesLimit = 1_024 * 1_024;
