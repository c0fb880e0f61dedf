import { valueDeck } from '../element-line';
import type { KindDeck } from '../kind';

/** A C element is polarised only where a fact line says so. */
export const polarisedCapacitorDeck: KindDeck = { ...valueDeck('C', ['+', '-'], 10e-6), read: () => false };
