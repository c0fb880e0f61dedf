import { revisionNetlist } from '@/db/queries/revisions';
import { given } from '@/lib/http/answer';
import { getRevisionNetlist } from '@/lib/http/operations/review';
import { serve } from '@/lib/http/serve';

export const GET = serve(getRevisionNetlist, async ({ db, access }) => given(await revisionNetlist(db, access.revision)));
