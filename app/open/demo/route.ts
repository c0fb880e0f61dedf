import { database } from '@/db/client';
import { openDemo } from '@/lib/http/open-link';

export const GET = async (): Promise<Response> => openDemo(database());
