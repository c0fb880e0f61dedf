import { z } from 'zod';
import { holdPointSchema } from './hold-point';
import { idSchema, personRefSchema, plainText } from './text';

export const revisionStates = ['cut', 'in review', 'changes asked', 'signed off', 'superseded', 'withdrawn'] as const;
export type RevisionState = (typeof revisionStates)[number];

export const requirementResults = ['satisfied', 'not satisfied', 'not applicable', 'overridden', 'error'] as const;

/** What must hold before a revision can be signed off to `holdPoint`; `id` is the code a refusal would carry. */
export const requirementSchema = z.object({
  id: z.string(),
  holdPoint: z.string(),
  result: z.enum(requirementResults),
  /** Designators of findings, else ids of what stands against it. */
  refs: z.array(z.string()),
});
export type Requirement = z.infer<typeof requirementSchema>;

export const signOffSchema = z.object({
  id: z.string(),
  holdPoint: z.string(),
  by: personRefSchema,
  at: z.string(),
  until: z.string(),
  conditions: z.string().nullable(),
  withdrawnAt: z.string().optional(),
  withdrawnBy: personRefSchema.optional(),
  withdrawReason: z.string().optional(),
});
export type SignOff = z.infer<typeof signOffSchema>;

export const objectionSchema = z.object({
  id: z.string(),
  revision: z.object({ id: z.string(), letter: z.string() }),
  by: personRefSchema,
  at: z.string(),
  reason: z.string(),
  liftedAt: z.string().optional(),
  liftedBy: personRefSchema.optional(),
  /** Present when a steward overrode it: the reason stays visible. */
  overrideReason: z.string().optional(),
});
export type Objection = z.infer<typeof objectionSchema>;

export const revisionSchema = z.object({
  id: z.string(),
  letter: z.string(),
  circuitId: z.string(),
  seq: z.number(),
  contentHash: z.string(),
  presentationHash: z.string(),
  state: z.enum(revisionStates),
  note: z.string(),
  cutBy: personRefSchema,
  cutAt: z.string(),
  askedAt: z.string().nullable(),
  reviewers: z.array(personRefSchema),
  contributors: z.array(personRefSchema),
  holdPoints: z.array(holdPointSchema),
  signOffs: z.array(signOffSchema),
  objections: z.array(objectionSchema),
  requirements: z.array(requirementSchema),
  /** How many findings of each severity were stored at the cut. */
  counts: z.object({ stop: z.number(), caution: z.number(), advice: z.number(), undetermined: z.number() }),
});
export type Revision = z.infer<typeof revisionSchema>;

export const cutSchema = z.strictObject({
  note: plainText(2_000).default(''),
  seq: z.number().int().nonnegative().optional(),
});
export type Cut = z.infer<typeof cutSchema>;

export const askSchema = z.strictObject({
  reviewers: z.array(idSchema).max(20, 'At most 20 reviewers.').default([]),
});
export type Ask = z.infer<typeof askSchema>;

const reasonSchema = plainText(2_000).min(1, 'Give the reason.');

export const newSignOffSchema = z.strictObject({
  holdPoint: z.string().trim().min(1).max(120),
  contentHash: z.string().min(1).max(128),
  conditions: plainText(4_000).optional(),
  /** A date (its end, UTC) or a moment. */
  until: z.union([z.iso.date(), z.iso.datetime({ offset: true })]).optional(),
});
export type NewSignOff = z.infer<typeof newSignOffSchema>;

export const newObjectionSchema = z.strictObject({ reason: reasonSchema });
/** Withdrawing or lifting one's own needs no reason; a steward's act does. */
export const endingSchema = z.strictObject({ reason: reasonSchema.optional() });
export type Ending = z.infer<typeof endingSchema>;
