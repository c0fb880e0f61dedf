import { Problem } from '@/lib/errors/problem';
import { respondProblem } from '@/lib/http/respond';
import { requestId } from '@/lib/log/request-id';

/** Addresses that are none: the same kind of answer as everywhere else. */
const nothingHere = async (request: Request): Promise<Response> => respondProblem(new Problem('not-found'), requestId(request.headers));

export { nothingHere as GET, nothingHere as POST, nothingHere as PUT, nothingHere as PATCH, nothingHere as DELETE };
