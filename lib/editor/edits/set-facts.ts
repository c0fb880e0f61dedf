import { factValueSchema, type PartRecord, type Sheet } from '@/lib/document/records';
import { isFactKey, factRegistry } from '@/lib/netlist/facts/fact-registry';
import { withParts } from './edit';

export type FactChanges = Readonly<Record<string, PartRecord['facts'][string] | readonly [number, number] | null>>;

/** Why a fact cannot have this value; null when it can. Bounds are those of the vocabulary, in SI units. */
export function refusedFact(key: string, value: FactChanges[string]): string | null {
  if (value === null) return null;
  if (!factValueSchema.safeParse(value).success) return `${key} cannot be that.`;
  if (!isFactKey(key) || typeof value !== 'number') return null;
  const { label, unit, min, max } = factRegistry[key];
  if (!Number.isFinite(value)) return `${label} is a number.`;
  if (min !== undefined && value < min) return `${label} is at least ${min} ${unit}.`.replace(' .', '.');
  if (max !== undefined && value > max) return `${label} is at most ${max} ${unit}.`.replace(' .', '.');
  return null;
}

/** Sets facts of one part; null takes a fact away. A fact set here is no longer assumed: it comes from `origin`. */
export function setFacts(sheet: Sheet, partId: string, changes: FactChanges, origin: PartRecord['origins'][string] = 'typed'): Sheet {
  return withParts(sheet, (part) => {
    if (part.id !== partId) return part;
    const facts = { ...part.facts };
    const origins = { ...part.origins };
    for (const [key, value] of Object.entries(changes)) {
      if (value === null) {
        delete facts[key];
        delete origins[key];
      } else {
        facts[key] = (Array.isArray(value) ? [value[0], value[1]] : value) as PartRecord['facts'][string];
        if (origin === 'typed') delete origins[key]; else origins[key] = origin;
      }
    }
    return { ...part, facts, origins };
  });
}
