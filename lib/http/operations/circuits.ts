import { z } from 'zod';
import { findingSchema } from '@/lib/netlist/findings/finding';
import { checkAnswerSchema } from '@/lib/schemas/check';
import {
  checkScopeSchema, circuitPatchSchema, circuitSchema, deckInputSchema, makersSchema, maxDeckBytes, newCircuitSchema,
} from '@/lib/schemas/circuit';
import { holdPointSchema, planSchema } from '@/lib/schemas/hold-point';
import { netlistSchema } from '@/lib/schemas/netlist';
import { pageOf, pageQuerySchema } from '@/lib/schemas/page';
import { ticketSchema } from '@/lib/schemas/ticket';
import { operation } from '../operation';

/** JSON may write a byte of a deck in six. */
const deckBodyLimit = 6 * maxDeckBytes + 4_096;
const read = ['read the circuit'] as const;
const edit = ['edit the sheet'] as const;

export const listCircuits = operation({
  id: 'listCircuits', method: 'GET', path: '/api/benches/{bench}/circuits', summary: 'Circuits of a bench, last changed first', who: 'person',
  target: 'bench', actions: ['read the bench'],
  query: pageQuerySchema.extend({ archived: z.literal('yes').optional() }), answers: { 200: pageOf(circuitSchema) },
});
export const postCircuit = operation({
  id: 'postCircuit', method: 'POST', path: '/api/benches/{bench}/circuits', summary: 'Post a circuit, empty or from a deck', who: 'person',
  target: 'bench', actions: ['post a circuit'], body: newCircuitSchema, bodyLimit: deckBodyLimit, answers: { 201: circuitSchema },
});
export const getCircuit = operation({
  id: 'getCircuit', method: 'GET', path: '/api/circuits/{id}', summary: 'A circuit', who: 'person', target: 'circuit', actions: read,
  answers: { 200: circuitSchema },
});
export const patchCircuit = operation({
  id: 'patchCircuit', method: 'PATCH', path: '/api/circuits/{id}', summary: 'Rename a circuit, or restore it', who: 'person', target: 'circuit',
  actions: ['edit the sheet', 'archive the circuit'], body: circuitPatchSchema, answers: { 200: circuitSchema },
});
export const archiveCircuit = operation({
  id: 'archiveCircuit', method: 'DELETE', path: '/api/circuits/{id}', summary: 'Archive a circuit', who: 'person', target: 'circuit',
  actions: ['archive the circuit'], answers: { 204: 'empty' },
});
export const getNetlist = operation({
  id: 'getNetlist', method: 'GET', path: '/api/circuits/{id}/netlist', summary: 'Canonical netlist of the live sheet', who: 'person',
  target: 'circuit', actions: read, answers: { 200: netlistSchema },
});
export const getDeck = operation({
  id: 'getDeck', method: 'GET', path: '/api/circuits/{id}/deck', summary: 'The live sheet as a SPICE deck with fact lines', who: 'person',
  target: 'circuit', actions: read, answers: { 200: 'text' },
});
export const putDeck = operation({
  id: 'putDeck', method: 'PUT', path: '/api/circuits/{id}/deck', summary: 'Replace parts, wires and net names by a deck', who: 'person',
  target: 'circuit', actions: edit, body: deckInputSchema, bodyLimit: deckBodyLimit, answers: { 200: circuitSchema },
});
export const getFindings = operation({
  id: 'getFindings', method: 'GET', path: '/api/circuits/{id}/findings', summary: 'Check the live sheet now', who: 'person', target: 'circuit',
  actions: ['run checks'], engine: true, query: checkScopeSchema, answers: { 200: z.object({ findings: z.array(findingSchema) }) },
});
export const putHoldPoints = operation({
  id: 'putHoldPoints', method: 'PUT', path: '/api/circuits/{id}/hold-points', summary: 'Set the power-up plan', who: 'person', target: 'circuit',
  actions: edit, body: planSchema, answers: { 200: z.object({ items: z.array(holdPointSchema), next: z.null() }) },
});
export const putMakers = operation({
  id: 'putMakers', method: 'PUT', path: '/api/circuits/{id}/makers', summary: 'Name the co-makers', who: 'person', target: 'circuit',
  actions: ['name makers'], body: makersSchema, answers: { 200: circuitSchema },
});
export const postTicket = operation({
  id: 'postTicket', method: 'POST', path: '/api/circuits/{id}/room-ticket', summary: 'Single-use ticket for the sheet’s room', who: 'person',
  target: 'circuit', actions: read, answers: { 201: ticketSchema },
});
export const checkDeck = operation({
  id: 'checkDeck', method: 'POST', path: '/api/check', summary: 'Check a deck, nothing stored', who: 'person', target: 'none', engine: true,
  body: deckInputSchema, bodyLimit: deckBodyLimit, answers: { 200: checkAnswerSchema },
});
