import { z } from 'zod';
import { auditRowSchema } from '@/lib/schemas/audit';
import { benchSchema, memberSchema, newBenchSchema } from '@/lib/schemas/bench';
import { healthSchema } from '@/lib/schemas/health';
import { pageOf, pageQuerySchema } from '@/lib/schemas/page';
import { endSessionsSchema, ownSessionSchema, signInSchema, whoSchema } from '@/lib/schemas/session';
import { operation } from '../operation';

export const getHealth = operation({
  id: 'getHealth', method: 'GET', path: '/api/health', summary: 'State of each part', who: 'anyone', target: 'none',
  answers: { 200: healthSchema, 503: healthSchema },
});
export const getOpenApi = operation({
  id: 'getOpenApi', method: 'GET', path: '/api/openapi.json', summary: 'This description', who: 'anyone', target: 'none',
  answers: { 200: z.record(z.string(), z.unknown()) },
});
export const signInCall = operation({
  id: 'signIn', method: 'POST', path: '/api/session', summary: 'Sign in', who: 'anyone', target: 'none',
  body: signInSchema, answers: { 201: whoSchema },
});
export const signOutCall = operation({
  id: 'signOut', method: 'DELETE', path: '/api/session', summary: 'Sign out', who: 'person', target: 'none',
  answers: { 204: 'empty' },
});
export const whoAmI = operation({
  id: 'whoAmI', method: 'GET', path: '/api/session', summary: 'Who am I', who: 'person', target: 'none', answers: { 200: whoSchema },
});
export const listSessions = operation({
  id: 'listSessions', method: 'GET', path: '/api/sessions', summary: 'One’s own sessions', who: 'person', target: 'none',
  answers: { 200: pageOf(ownSessionSchema) },
});
export const endSessions = operation({
  id: 'endSessions', method: 'DELETE', path: '/api/sessions', summary: 'End one of one’s sessions, or all but this one',
  who: 'person', target: 'none', body: endSessionsSchema, answers: { 204: 'empty' },
});
export const listBenches = operation({
  id: 'listBenches', method: 'GET', path: '/api/benches', summary: 'One’s benches', who: 'person', target: 'none',
  answers: { 200: pageOf(benchSchema) },
});
export const makeBench = operation({
  id: 'makeBench', method: 'POST', path: '/api/benches', summary: 'Make a bench, as its steward', who: 'person', target: 'none',
  body: newBenchSchema, answers: { 201: benchSchema },
});
export const listMembers = operation({
  id: 'listMembers', method: 'GET', path: '/api/benches/{bench}/members', summary: 'People of a bench', who: 'person', target: 'bench',
  actions: ['read the bench'], answers: { 200: pageOf(memberSchema) },
});
export const readAudit = operation({
  id: 'readAudit', method: 'GET', path: '/api/benches/{bench}/audit', summary: 'Audit record, newest first; a member sees that of their own circuits',
  who: 'person', target: 'bench', actions: ['see the audit record'], query: pageQuerySchema, answers: { 200: pageOf(auditRowSchema) },
});
