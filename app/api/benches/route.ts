import { ownBenches } from '@/db/queries/people';
import { makeBench as make } from '@/lib/circuits/make-bench';
import { given, made } from '@/lib/http/answer';
import { listBenches, makeBench } from '@/lib/http/operations/people';
import { serve } from '@/lib/http/serve';
import { actOf } from '@/lib/http/act-of';

export const GET = serve(listBenches, async ({ db, person }) => given({ items: await ownBenches(db, person.id), next: null }));

export const POST = serve(makeBench, async (call) => made(await make(actOf(call), call.body)));
