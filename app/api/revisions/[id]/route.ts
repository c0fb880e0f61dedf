import { given } from '@/lib/http/answer';
import { getRevision } from '@/lib/http/operations/review';
import { serve } from '@/lib/http/serve';
import { revisionView } from '@/lib/review/read-revision';

export const GET = serve(getRevision, async ({ db, access }) => given(await revisionView(db, access, access.revision)));
