/** What the deck builder asks of an engine: the part of `lib/spice`'s `Engine` that an operating point needs. */
export interface PointRequest {
  readonly lines: readonly string[];
  readonly analysis: 'op';
  readonly vectors: readonly string[];
}

export type PointAnswer =
  | { readonly status: 'ok'; readonly values: Readonly<Record<string, number>> }
  | { readonly status: string; readonly messages: readonly string[] };

export interface PointEngine {
  simulate(request: PointRequest): Promise<PointAnswer>;
}
