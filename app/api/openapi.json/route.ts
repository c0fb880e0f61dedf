import { given } from '@/lib/http/answer';
import { openApi } from '@/lib/http/open-api';
import { getOpenApi } from '@/lib/http/operations/people';
import { surface } from '@/lib/http/operations/surface';
import { serve } from '@/lib/http/serve';

export const GET = serve(getOpenApi, async () => given(openApi(surface)));
