import { checkLive } from '@/lib/circuits/check-live';
import { given } from '@/lib/http/answer';
import { getFindings } from '@/lib/http/operations/circuits';
import { serve } from '@/lib/http/serve';

export const GET = serve(getFindings, async ({ db, access, query }) => given({ findings: await checkLive(db, access, query) }));
