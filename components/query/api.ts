import { z } from 'zod';

const problemSchema = z.object({
  title: z.string().default('Something went wrong.'),
  status: z.number(),
  detail: z.string().optional(),
  code: z.string(),
  requestId: z.string().optional(),
  errors: z.array(z.object({ path: z.string(), message: z.string() })).optional(),
  line: z.number().optional(),
  reason: z.string().optional(),
  refs: z.array(z.string()).optional(),
  requirements: z.array(z.unknown()).optional(),
  retryAfter: z.number().optional(),
});
type ProblemBody = z.infer<typeof problemSchema>;

/** A refusal of the server, or why it could not be reached, in words for people. */
export class ApiProblem extends Error {
  constructor(readonly body: ProblemBody) {
    super(body.detail ?? body.title);
    this.name = 'ApiProblem';
  }

  get code(): string {
    return this.body.code;
  }

  /** What is wrong with one field of the input, if that was refused. */
  field(path: string): string | undefined {
    return this.body.errors?.find((error) => error.path === path)?.message;
  }
}

const unreachable: ProblemBody = {
  title: 'Holdoff does not answer.',
  status: 0,
  detail: 'Nothing was changed. Check the connection and try again.',
  code: 'unreachable',
};

async function problemOf(response: Response): Promise<ApiProblem> {
  const body = problemSchema.safeParse(await response.json().catch(() => null));
  return new ApiProblem(body.success ? body.data : { ...unreachable, status: response.status, title: 'Holdoff answered in a way this page does not know.' });
}

interface Call<Output> {
  readonly method?: 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';
  readonly body?: unknown;
  /** Null for calls that answer nothing. */
  readonly answer: z.ZodType<Output> | null;
  readonly signal?: AbortSignal;
}

/**
 * One call of the HTTP surface. The answer is parsed before anything sees it.
 * Throws ApiProblem for a refusal and when the server cannot be reached.
 */
export async function callApi<Output>(path: string, { method = 'GET', body, answer, signal }: Call<Output>): Promise<Output> {
  let response: Response;
  try {
    response = await fetch(path, {
      method,
      signal,
      headers: { accept: 'application/json', ...(body === undefined ? {} : { 'content-type': 'application/json' }) },
      body: body === undefined ? undefined : JSON.stringify(body),
    });
  } catch (error) {
    if (signal?.aborted) throw error;
    throw new ApiProblem(unreachable);
  }
  if (!response.ok) throw await problemOf(response);
  if (answer === null || response.status === 204) return undefined as Output;
  const parsed = answer.safeParse(await response.json().catch(() => null));
  if (!parsed.success) throw new ApiProblem({ ...unreachable, status: response.status, title: 'Holdoff answered in a way this page does not know.', detail: 'Reload the page; it may be older than the server.' });
  return parsed.data;
}

/** Words for any error a call can end with. */
export function wordsOf(error: unknown): { readonly title: string; readonly detail: string } {
  if (error instanceof ApiProblem) return { title: error.body.title, detail: error.body.detail ?? '' };
  return { title: 'Something went wrong on this page.', detail: 'Reload it; nothing that was saved is lost.' };
}
