import { z } from 'zod';
import type { ModelCard, Subcircuit } from '@/lib/netlist/netlist';
import { waveSchema } from '../records';
import type { FlatRecord } from '../stored-sheet';
import type { Repair } from './repair';

const numbers = z.record(z.string(), z.number());

export const modelCardSchema: z.ZodType<ModelCard> = z.object({
  name: z.string().min(1).max(80), type: z.string().max(20), params: numbers, flags: z.array(z.string().max(40)).max(20),
});

const elementSchema = z.object({
  letter: z.string().length(1), name: z.string().max(80), nodes: z.array(z.string().max(80)).max(200),
  value: z.number().optional(), wave: waveSchema.optional(), model: z.string().max(80).optional(),
  params: numbers, line: z.number().int().min(0),
});

export const subcircuitSchema: z.ZodType<Subcircuit> = z.lazy(() => z.object({
  name: z.string().min(1).max(80), pins: z.array(z.string().max(80)).max(200), elements: z.array(elementSchema).max(1_000),
  models: z.array(modelCardSchema).max(1_000), subcircuits: z.array(subcircuitSchema).max(100),
}));

/** Model cards and subcircuits of the stored library, by name. */
export function readLibrary(library: FlatRecord): {
  readonly models: readonly ModelCard[]; readonly subcircuits: readonly Subcircuit[]; readonly repairs: readonly Repair[];
} {
  const models: ModelCard[] = [];
  const subcircuits: Subcircuit[] = [];
  const repairs: Repair[] = [];
  for (const key of Object.keys(library).sort()) {
    const model = key.startsWith('model:') ? modelCardSchema.safeParse(library[key]) : null;
    const subcircuit = key.startsWith('subcircuit:') ? subcircuitSchema.safeParse(library[key]) : null;
    if (model?.success) models.push(model.data);
    else if (subcircuit?.success) subcircuits.push(subcircuit.data);
    else if (model || subcircuit) repairs.push({ collection: 'library', id: key, reason: 'not readable' });
  }
  return { models, subcircuits, repairs };
}
