import { database } from '@/db/client';
import { openGuestLink } from '@/lib/http/open-link';

export const GET = async (_request: Request, { params }: { readonly params: Promise<{ token: string }> }): Promise<Response> =>
  openGuestLink(database(), (await params).token);
