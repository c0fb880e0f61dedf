import { benchMembers } from '@/db/queries/people';
import { given } from '@/lib/http/answer';
import { listMembers } from '@/lib/http/operations/people';
import { serve } from '@/lib/http/serve';

export const GET = serve(listMembers, async ({ db, access }) => {
  const members = await benchMembers(db, access.bench);
  return given({ items: members.map((member) => ({ ...member, since: member.since.toISOString() })), next: null });
});
