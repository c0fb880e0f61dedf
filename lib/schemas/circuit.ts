import { z } from 'zod';
import { holdPointSchema } from './hold-point';
import { revisionStates } from './revision';
import { idSchema, lineSchema, personRefSchema } from './text';

export const maxDeckBytes = 256 * 1024;
/** A SPICE deck as text. What is wrong with it, its size included, is told by the reader. */
export const deckSchema = z.string();

/** State of a circuit: its newest revision's, or `draft` before the first cut. */
export const circuitStates = ['draft', ...revisionStates] as const;

export const waitingSchema = z.object({ id: z.string(), name: z.string(), why: z.string() });

export const circuitSchema = z.object({
  id: z.string(),
  title: z.string(),
  /** Slug of its bench. */
  bench: z.string(),
  state: z.enum(circuitStates),
  /** Head of the sheet's update log: what a cut takes. */
  seq: z.number(),
  makers: z.array(personRefSchema),
  holdPoints: z.array(holdPointSchema),
  /** Stops of the live sheet when it was last checked; null before the first check. */
  openStops: z.number().nullable(),
  counts: z.object({ stop: z.number(), caution: z.number(), advice: z.number(), seq: z.number() }).nullable(),
  /** Lowest voltage blocked by a stop; null when none is, or before the first check. */
  blockedAt: z.number().nullable(),
  /** Newest revision, and whether the sheet has moved on electrically since its cut. */
  newest: z.object({ id: z.string(), letter: z.string(), state: z.enum(revisionStates), seq: z.number() }).nullable(),
  draft: z.boolean(),
  /** Highest hold point with a standing sign-off. */
  reached: z.object({ letter: z.string(), holdPoint: z.string(), volts: z.number(), until: z.string() }).nullable(),
  waitingFor: z.array(waitingSchema),
  changedAt: z.string(),
  archivedAt: z.string().nullable(),
  /** What the reader may do here: hints for the screen, decided anew by every call. */
  may: z.array(z.string()),
});
export type Circuit = z.infer<typeof circuitSchema>;

export const newCircuitSchema = z.strictObject({ title: lineSchema, deck: deckSchema.optional() });
export type NewCircuit = z.infer<typeof newCircuitSchema>;

/** Renames a circuit, or restores it from the archive. */
export const circuitPatchSchema = z.strictObject({ title: lineSchema.optional(), archived: z.literal(false).optional() });
export type CircuitPatch = z.infer<typeof circuitPatchSchema>;

export const deckInputSchema = z.strictObject({ deck: deckSchema });
export const makersSchema = z.strictObject({ makers: z.array(idSchema).max(50, 'At most 50 makers.') });

export const checkScopeSchema = z.object({ scenario: z.string().optional(), outcomes: z.literal('all').optional() });
export type CheckScope = z.infer<typeof checkScopeSchema>;
