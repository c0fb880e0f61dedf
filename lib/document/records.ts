import { z } from 'zod';
import { kindIds } from '@/lib/netlist/kinds/kind-id';

/** Sheet units; the grid is 10. */
export const gridUnit = 10;

const coordinate = z.number().int().min(-20_000).max(20_000).multipleOf(gridUnit);
const id = z.string().min(1).max(64);
const oneLine = z.string().max(120).regex(/^[^\p{Cc}]*$/u, 'One line without control characters');

export const factValueSchema = z.union([
  z.number(), z.string().max(2_000), z.boolean(), z.tuple([z.number(), z.number()]),
]);

export const waveSchema = z.object({ shape: z.enum(['sin', 'pulse', 'exp', 'pwl']), args: z.array(z.number()).max(400) });

/** A part, mark or note on the sheet. `turn` is degrees clockwise; mirroring comes before turning. */
export const partRecordSchema = z.object({
  id,
  ref: z.string().max(40),
  kind: z.enum(kindIds),
  x: coordinate,
  y: coordinate,
  turn: z.union([z.literal(0), z.literal(90), z.literal(180), z.literal(270)]),
  mirror: z.boolean(),
  facts: z.record(z.string(), factValueSchema),
  origins: z.record(z.string(), z.enum(['typed', 'data sheet', 'catalogue', 'model card', 'assumed'])),
  /** Pin names marked left open. */
  leftOpen: z.array(z.string().max(20)),
  wave: waveSchema.optional(),
  /** Model or subcircuit name of the sheet's library. */
  model: z.string().max(80).optional(),
  /** Pin names of a box, in order; other kinds have fixed pins. */
  boxPins: z.array(z.string().max(20)).max(64).optional(),
  params: z.record(z.string(), z.number()).optional(),
});

export const endSchema = z.discriminatedUnion('at', [
  z.object({ at: z.literal('pin'), part: id, pin: z.string().max(20) }),
  z.object({ at: z.literal('junction'), junction: id }),
]);

/** A point where wires meet, or a loose end when only one does. */
export const junctionRecordSchema = z.object({ id, x: coordinate, y: coordinate });

/** A wire between two ends. `bends` are the corners a person set; missing corners are worked out, always at right angles. */
export const wireRecordSchema = z.object({
  id,
  a: endSchema,
  b: endSchema,
  bends: z.array(z.tuple([coordinate, coordinate])).max(60),
});

export const scenarioRecordSchema = z.object({
  id,
  name: oneLine.min(1),
  ambient: z.number().min(-55).max(150),
  /** By part id of the source. */
  values: z.record(z.string(), z.object({ volts: z.number().optional(), amps: z.number().positive().optional() })),
});

export const holdPointRecordSchema = z.object({
  id,
  name: oneLine.min(1),
  /** Scenario id. */
  scenario: z.string().optional(),
  /** Part id of the power source. */
  source: z.string().optional(),
  volts: z.number().positive().max(100_000),
  amps: z.number().positive().max(10_000),
});

export type PartRecord = z.infer<typeof partRecordSchema>;
export type JunctionRecord = z.infer<typeof junctionRecordSchema>;
export type WireRecord = z.infer<typeof wireRecordSchema>;
export type WireEnd = z.infer<typeof endSchema>;
export type ScenarioRecord = z.infer<typeof scenarioRecordSchema>;
export type HoldPointRecord = z.infer<typeof holdPointRecordSchema>;

/** The sheet as plain records: what the Yjs document holds once read and repaired. */
export interface Sheet {
  readonly title: string;
  readonly parts: readonly PartRecord[];
  readonly wires: readonly WireRecord[];
  readonly junctions: readonly JunctionRecord[];
  readonly scenarios: readonly ScenarioRecord[];
  readonly holdPoints: readonly HoldPointRecord[];
  /** Library of a posted deck: its model cards and subcircuits, as JSON of the netlist's types. */
  readonly models: readonly import('@/lib/netlist/netlist').ModelCard[];
  readonly subcircuits: readonly import('@/lib/netlist/netlist').Subcircuit[];
}
