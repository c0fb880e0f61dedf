import { z } from 'zod';
import { limits } from './limits';

const coordinate = z.number().finite().min(-100_000).max(100_000);

/** What a page may say about its person: where they point and what they have in hand. Never stored, never logged. */
export const presenceFieldsSchema = z.strictObject({
  /** Sheet units. */
  cursor: z.strictObject({ x: coordinate, y: coordinate }).nullable().optional(),
  /** Ids of selected parts and wires. */
  selection: z.array(z.string().max(64)).max(24).optional(),
  /** Id of the part whose form is open. */
  editing: z.string().max(64).nullable().optional(),
  tool: z.string().max(40).optional(),
});

export type PresenceFields = z.infer<typeof presenceFieldsSchema>;

/** One connection as the others see it. Everything but `fields` is stamped by the server. */
export const presenceEntrySchema = z.object({
  connection: z.string().max(40),
  /** Null for a guest. */
  person: z.string().max(26).nullable(),
  name: z.string().max(120),
  /** A position in the interface's row of presence colours. */
  colour: z.number().int().min(0).max(7),
  /** Null when the connection has gone. */
  fields: presenceFieldsSchema.nullable(),
});

export type PresenceEntry = z.infer<typeof presenceEntrySchema>;

/** Reads a client's presence text. Returns undefined when it is too long or says anything that is not allowed. */
export function readPresenceFields(text: string): PresenceFields | undefined {
  if (text.length > limits.presenceBytes) return undefined;
  try {
    return presenceFieldsSchema.safeParse(JSON.parse(text)).data;
  } catch {
    return undefined;
  }
}
