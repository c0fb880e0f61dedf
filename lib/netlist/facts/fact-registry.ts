import type { FactDefinition } from './fact-definition';
import { generalFacts } from './general-facts';
import { passiveFacts } from './passive-facts';
import { sourceFacts } from './source-facts';
import { transistorFacts } from './transistor-facts';

const definitions = { ...generalFacts, ...transistorFacts, ...passiveFacts, ...sourceFacts };

/** Name of a fact: the same on a form, in the netlist and in a deck's fact line. */
export type FactKey = keyof typeof definitions;

/** The one vocabulary of facts. */
export const factRegistry: Readonly<Record<FactKey, FactDefinition>> = definitions;

export const factKeys: readonly FactKey[] = Object.keys(definitions) as FactKey[];

export function isFactKey(key: string): key is FactKey {
  return Object.hasOwn(definitions, key);
}
