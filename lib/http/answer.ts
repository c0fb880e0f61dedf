/** What a handler answers with; the wrapper makes the response. */
export interface Answer {
  readonly status: number;
  readonly body?: unknown;
  readonly headers?: Readonly<Record<string, string>>;
}

export const given = (body: unknown, headers?: Answer['headers']): Answer => ({ status: 200, body, headers });
/** 201 for a thing made now, 200 when this was a repeat and the first answer is given again. */
export const made = (result: { readonly value: unknown; readonly first: boolean }): Answer => ({ status: result.first ? 201 : 200, body: result.value });
export const empty = (headers?: Answer['headers']): Answer => ({ status: 204, headers });
