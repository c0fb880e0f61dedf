import { auditPage } from '@/lib/circuits/audit-view';
import { given } from '@/lib/http/answer';
import { readAudit } from '@/lib/http/operations/people';
import { serve } from '@/lib/http/serve';

export const GET = serve(readAudit, async ({ db, access, person, query }) => given(await auditPage(db, access, person, query)));
