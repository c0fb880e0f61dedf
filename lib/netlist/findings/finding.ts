import { z } from 'zod';

export const outcomes = ['fail', 'pass', 'undetermined', 'not applicable', 'error'] as const;
export const severities = ['stop', 'caution', 'advice'] as const;
export const confidences = ['proven', 'likely', 'heuristic'] as const;
export const corners = ['min', 'typ', 'max'] as const;

/** One fact a verdict rests on. From the evidence alone the verdict can be computed again. */
export const evidenceSchema = z.object({
  /** Designator, pin (`Q1:G`) or net name. */
  entity: z.string(),
  /** Fact key or measured quantity: `current`, `power`, `voltage`, `crossing` … */
  quantity: z.string(),
  value: z.union([z.number(), z.string(), z.boolean()]),
  unit: z.string(),
  /** Where the value comes from: `typed`, `data sheet`, `assumed`, `operating point at high, 15 V` … */
  source: z.string(),
  limit: z.number().optional(),
  limitSource: z.string().optional(),
});

/** One concrete edit of a proposed change, in terms of designators, pins and nets, independent of placement. */
export const remedyEditSchema = z.discriminatedUnion('edit', [
  /** Adds a part of `kind` with `facts`, its pins joined to the named nets. */
  z.object({ edit: z.literal('add part'), kind: z.string(), facts: z.record(z.string(), z.union([z.number(), z.string(), z.boolean()])), pins: z.record(z.string(), z.string()) }),
  /** Changes facts of one part; null removes a fact. */
  z.object({ edit: z.literal('set facts'), part: z.string(), facts: z.record(z.string(), z.union([z.number(), z.string(), z.boolean(), z.null()])) }),
  /** Moves one pin of a part to another net. */
  z.object({ edit: z.literal('move pin'), part: z.string(), pin: z.string(), net: z.string() }),
  /** Swaps what two pins of a part are joined to (a diode turned round). */
  z.object({ edit: z.literal('swap pins'), part: z.string(), pins: z.tuple([z.string(), z.string()]) }),
  /** Changes the designator of one part, named by its id because designators may be doubled. */
  z.object({ edit: z.literal('rename part'), partId: z.string(), ref: z.string() }),
  /** Marks a pin left open. */
  z.object({ edit: z.literal('leave open'), part: z.string(), pin: z.string() }),
  /** Gives every net name equal to `from` the name `to`. */
  z.object({ edit: z.literal('rename net'), from: z.string(), to: z.string() }),
]);

export const remedySchema = z.object({ words: z.string(), edits: z.array(remedyEditSchema).optional() });

/** A finding as every API answers it (`docs/architecture.md`). */
export const findingSchema = z.object({
  id: z.string(),
  fingerprint: z.string(),
  rule: z.string(),
  outcome: z.enum(outcomes),
  severity: z.enum(severities),
  confidence: z.enum(confidences),
  /** One to four designators, the part to change first. */
  refs: z.array(z.string()),
  nets: z.array(z.string()),
  /** Lowest hold point with this severity; null without a plan. */
  holdPoint: z.string().nullable(),
  fromVolts: z.number().nullable(),
  scenario: z.string().nullable(),
  state: z.string(),
  corner: z.enum(corners),
  message: z.string(),
  evidence: z.array(evidenceSchema),
  remedy: remedySchema.optional(),
});

export type Evidence = z.infer<typeof evidenceSchema>;
export type RemedyEdit = z.infer<typeof remedyEditSchema>;
export type Remedy = z.infer<typeof remedySchema>;
export type Finding = z.infer<typeof findingSchema>;
export type Severity = Finding['severity'];
export type Confidence = Finding['confidence'];
export type OutcomeKind = Finding['outcome'];
