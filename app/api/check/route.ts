import { checkDeckText } from '@/lib/circuits/check-deck-text';
import { given } from '@/lib/http/answer';
import { checkDeck } from '@/lib/http/operations/circuits';
import { serve } from '@/lib/http/serve';

export const POST = serve(checkDeck, async ({ body }) => given(await checkDeckText(body.deck)));
