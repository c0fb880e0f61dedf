import { given } from '@/lib/http/answer';
import { getRevisionFindings } from '@/lib/http/operations/review';
import { serve } from '@/lib/http/serve';
import { storedFindings } from '@/lib/review/stored-findings';

export const GET = serve(getRevisionFindings, async ({ db, access, query }) => given({ findings: await storedFindings(db, access.revision, query) }));
