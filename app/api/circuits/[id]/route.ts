import { circuitView, circuitViewOf } from '@/lib/circuits/circuit-view';
import { archive, patchCircuit as patch } from '@/lib/circuits/keep-circuit';
import { actOf } from '@/lib/http/act-of';
import { empty, given } from '@/lib/http/answer';
import { archiveCircuit, getCircuit, patchCircuit } from '@/lib/http/operations/circuits';
import { serve } from '@/lib/http/serve';
import { rooms } from '@/lib/rooms/room-client';

export const GET = serve(getCircuit, async ({ db, access }) => given(await circuitView(db, access)));

export const PATCH = serve(patchCircuit, async (call) => {
  await patch(actOf(call), call.access, call.body);
  await rooms().announce({ circuitId: call.access.circuit, topic: 'circuit' });
  return given(await circuitViewOf(call.db, call.caller, call.access.circuit));
});

export const DELETE = serve(archiveCircuit, async (call) => {
  await archive(actOf(call), call.access);
  await rooms().announce({ circuitId: call.access.circuit, topic: 'circuit' });
  return empty();
});
