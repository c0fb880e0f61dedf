import { z } from 'zod';
import { findingSchema } from '@/lib/netlist/findings/finding';
import { checkScopeSchema } from '@/lib/schemas/circuit';
import { netlistSchema } from '@/lib/schemas/netlist';
import { pageOf, pageQuerySchema } from '@/lib/schemas/page';
import {
  askSchema, cutSchema, endingSchema, newObjectionSchema, newSignOffSchema, objectionSchema, revisionSchema, signOffSchema,
} from '@/lib/schemas/revision';
import { messageSchema, newMessageSchema, newThreadSchema, threadPatchSchema, threadSchema } from '@/lib/schemas/thread';
import { operation } from '../operation';

const read = ['read the circuit'] as const;

export const cutCall = operation({
  id: 'cutRevision', method: 'POST', path: '/api/circuits/{id}/revisions', summary: 'Cut a revision', who: 'person', target: 'circuit',
  actions: ['cut a revision'], engine: true, body: cutSchema, answers: { 201: revisionSchema },
});
export const listRevisions = operation({
  id: 'listRevisions', method: 'GET', path: '/api/circuits/{id}/revisions', summary: 'Revisions, newest first', who: 'person', target: 'circuit',
  actions: read, query: pageQuerySchema, answers: { 200: pageOf(revisionSchema) },
});
export const getRevision = operation({
  id: 'getRevision', method: 'GET', path: '/api/revisions/{id}', summary: 'A revision', who: 'person', target: 'revision', actions: read,
  answers: { 200: revisionSchema },
});
export const getRevisionFindings = operation({
  id: 'getRevisionFindings', method: 'GET', path: '/api/revisions/{id}/findings', summary: 'What the checks said at the cut', who: 'person',
  target: 'revision', actions: read, query: checkScopeSchema, answers: { 200: z.object({ findings: z.array(findingSchema) }) },
});
export const getRevisionNetlist = operation({
  id: 'getRevisionNetlist', method: 'GET', path: '/api/revisions/{id}/netlist', summary: 'Canonical netlist of the cut', who: 'person',
  target: 'revision', actions: read, answers: { 200: netlistSchema },
});
export const getRevisionSheet = operation({
  id: 'getRevisionSheet', method: 'GET', path: '/api/revisions/{id}/sheet', summary: 'The drawing of the cut, as plain records, with the volts of its nets by hold point', who: 'person',
  target: 'revision', actions: read, answers: { 200: z.record(z.string(), z.unknown()) },
});
export const askCall = operation({
  id: 'askForReview', method: 'POST', path: '/api/revisions/{id}/review', summary: 'Ask for review', who: 'person', target: 'revision',
  actions: ['ask for review'], body: askSchema, answers: { 201: revisionSchema },
});
export const signOffCall = operation({
  id: 'signOff', method: 'POST', path: '/api/revisions/{id}/sign-offs', summary: 'Sign off up to a hold point', who: 'person',
  target: 'revision', actions: ['sign off'], fresh: true, body: newSignOffSchema, answers: { 201: signOffSchema },
});
export const withdrawCall = operation({
  id: 'withdrawSignOff', method: 'DELETE', path: '/api/sign-offs/{id}', summary: 'Withdraw a sign-off', who: 'person', target: 'sign-off',
  actions: ['withdraw own sign-off', 'withdraw another’s sign-off'], fresh: true, body: endingSchema, answers: { 200: signOffSchema },
});
export const objectCall = operation({
  id: 'askForChanges', method: 'POST', path: '/api/revisions/{id}/objections', summary: 'Ask for changes', who: 'person', target: 'revision',
  actions: ['ask for changes'], body: newObjectionSchema, answers: { 201: objectionSchema },
});
export const liftCall = operation({
  id: 'liftObjection', method: 'DELETE', path: '/api/objections/{id}', summary: 'Lift one’s own, or override another’s with a reason',
  who: 'person', target: 'objection', actions: ['lift own objection', 'override an objection'], body: endingSchema, answers: { 200: objectionSchema },
});
export const listThreads = operation({
  id: 'listThreads', method: 'GET', path: '/api/circuits/{id}/threads', summary: 'Margin notes', who: 'person', target: 'circuit',
  actions: ['read the bench'], answers: { 200: z.object({ items: z.array(threadSchema) }) },
});
export const openThread = operation({
  id: 'openThread', method: 'POST', path: '/api/circuits/{id}/threads', summary: 'Write a margin note', who: 'person', target: 'circuit',
  actions: ['write notes'], body: newThreadSchema, answers: { 201: threadSchema },
});
export const replyCall = operation({
  id: 'reply', method: 'POST', path: '/api/threads/{id}/messages', summary: 'Reply', who: 'person', target: 'thread', actions: ['write notes'],
  body: newMessageSchema, answers: { 201: messageSchema },
});
export const moveThread = operation({
  id: 'moveThread', method: 'PATCH', path: '/api/threads/{id}', summary: 'Answer, resolve or reopen a note', who: 'person', target: 'thread',
  actions: ['write notes'], body: threadPatchSchema, answers: { 200: threadSchema },
});
export const editMessage = operation({
  id: 'editMessage', method: 'PATCH', path: '/api/messages/{id}', summary: 'Edit one’s own message', who: 'person', target: 'message',
  actions: ['edit own message'], body: newMessageSchema, answers: { 200: messageSchema },
});
