import { given } from '@/lib/http/answer';
import { getRevisionSheet } from '@/lib/http/operations/review';
import { serve } from '@/lib/http/serve';
import { storedSheet } from '@/lib/review/stored-sheet';

export const GET = serve(getRevisionSheet, async ({ db, access }) => given(await storedSheet(db, access.revision)));
