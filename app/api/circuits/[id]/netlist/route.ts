import { liveNetlist } from '@/lib/circuits/live-netlist';
import { given } from '@/lib/http/answer';
import { getNetlist } from '@/lib/http/operations/circuits';
import { serve } from '@/lib/http/serve';

export const GET = serve(getNetlist, async ({ db, access }) => given((await liveNetlist(db, access)).netlist));
