import { given } from '@/lib/http/answer';
import { readHealth } from '@/lib/http/health';
import { getHealth } from '@/lib/http/operations/people';
import { serve } from '@/lib/http/serve';

export const GET = serve(getHealth, async ({ db }) => {
  const health = await readHealth(db);
  return { ...given(health), status: health.status === 'ok' ? 200 : 503 };
});
