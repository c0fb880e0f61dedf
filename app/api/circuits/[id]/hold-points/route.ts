import { setPlan } from '@/lib/circuits/set-plan';
import { actOf } from '@/lib/http/act-of';
import { given } from '@/lib/http/answer';
import { putHoldPoints } from '@/lib/http/operations/circuits';
import { serve } from '@/lib/http/serve';

export const PUT = serve(putHoldPoints, async (call) => given({ items: await setPlan(actOf(call), call.access, call.body), next: null }));
