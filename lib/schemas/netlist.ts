import { z } from 'zod';
import { kindIds } from '@/lib/netlist/kinds/kind-id';
import type { Netlist, Subcircuit } from '@/lib/netlist/netlist';

const numbers = z.record(z.string(), z.number());
const factValue = z.union([z.number(), z.string(), z.boolean(), z.tuple([z.number(), z.number()])]);
const facts = z.record(z.string(), factValue);
const wave = z.object({ shape: z.enum(['sin', 'pulse', 'exp', 'pwl']), args: z.array(z.number()) });
const model = z.object({ name: z.string(), type: z.string(), params: numbers, flags: z.array(z.string()) });
const element = z.object({
  letter: z.string(), name: z.string(), nodes: z.array(z.string()), value: z.number().optional(), wave: wave.optional(),
  model: z.string().optional(), params: numbers, line: z.number(),
});
const subcircuit: z.ZodType<Subcircuit> = z.lazy(() => z.object({
  name: z.string(), pins: z.array(z.string()), elements: z.array(element), models: z.array(model),
  subcircuits: z.array(subcircuit),
}));

/** The canonical netlist, as stored with a revision and as `GET …/netlist` answers it. */
export const netlistSchema = z.object({
  format: z.literal(1),
  title: z.string(),
  parts: z.array(z.object({
    id: z.string(), ref: z.string(), kind: z.enum(kindIds), pins: z.record(z.string(), z.string()), facts,
    origins: z.record(z.string(), z.enum(['typed', 'data sheet', 'catalogue', 'model card', 'assumed'])),
    wave: wave.optional(), model: z.string().optional(), params: numbers.optional(), leftOpen: z.array(z.string()),
  })),
  nets: z.array(z.object({ name: z.string(), givenNames: z.array(z.string()), pins: z.array(z.string()), facts })),
  models: z.array(model),
  subcircuits: z.array(subcircuit),
  scenarios: z.array(z.object({
    name: z.string(), ambient: z.number(),
    values: z.record(z.string(), z.object({ volts: z.number().optional(), amps: z.number().optional() })),
  })),
  holdPoints: z.array(z.object({
    name: z.string(), scenario: z.string().optional(), source: z.string().optional(), volts: z.number(), amps: z.number(),
  })),
}).transform((value) => value as Netlist);
