import { valueDeck } from '../element-line';
import type { KindDeck } from '../kind';

/** An L element is an air-core coil only where a fact line says so. */
export const airCoreCoilDeck: KindDeck = { ...valueDeck('L', ['1', '2'], 1e-6), read: () => false };
