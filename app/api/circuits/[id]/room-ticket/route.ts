import { giveTicket } from '@/lib/circuits/give-ticket';
import { made } from '@/lib/http/answer';
import { postTicket } from '@/lib/http/operations/circuits';
import { serve } from '@/lib/http/serve';
import { first } from '@/lib/review/act';

export const POST = serve(postTicket, async ({ db, caller, access, request }) => made(first(await giveTicket(db, caller, access, request.headers.get('host')))));
