import { circuitViewOf } from '@/lib/circuits/circuit-view';
import { listBenchCircuits } from '@/lib/circuits/list-circuits';
import { postCircuit as post } from '@/lib/circuits/post-circuit';
import { actOf } from '@/lib/http/act-of';
import { given, made } from '@/lib/http/answer';
import { listCircuits, postCircuit } from '@/lib/http/operations/circuits';
import { serve } from '@/lib/http/serve';

export const GET = serve(listCircuits, async ({ db, access, person, query }) => given(await listBenchCircuits(db, access, person, query)));

export const POST = serve(postCircuit, async (call) => {
  const { value, first } = await post(actOf(call), call.access, call.body);
  return made({ value: await circuitViewOf(call.db, call.caller, value), first });
});
