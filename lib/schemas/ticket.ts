import { z } from 'zod';

/** Single-use ticket for a sheet's room. `url` is the websocket's address. */
export const ticketSchema = z.object({ ticket: z.string(), url: z.string(), expiresAt: z.string() });
export type Ticket = z.infer<typeof ticketSchema>;
