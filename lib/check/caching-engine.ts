import type { PointAnswer, PointEngine, PointRequest } from '@/lib/netlist/engine-deck/engine-port';

/** Answers kept at most; the oldest go first. */
const kept = 2_000;

/** Answers of an engine by what was asked: a point whose deck an edit leaves alone is not run again. */
export class PointCache {
  private readonly answers = new Map<string, Promise<PointAnswer>>();

  answer(request: PointRequest, run: () => Promise<PointAnswer>): Promise<PointAnswer> {
    const key = [...request.vectors, '', ...request.lines].join('\n');
    const known = this.answers.get(key);
    if (known) return known;
    const answer = run();
    this.answers.set(key, answer);
    const forget = (): void => {
      if (this.answers.get(key) === answer) this.answers.delete(key);
    };
    answer.then((given) => { if (given.status === 'timeout' || given.status === 'crash' || given.status === 'fatal') forget(); }, forget);
    if (this.answers.size > kept) this.answers.delete(this.answers.keys().next().value as string);
    return answer;
  }
}

/** An engine that asks once for each different request. */
export function cachingEngine(engine: PointEngine, cache: PointCache): PointEngine {
  return { simulate: (request) => cache.answer(request, () => engine.simulate(request)) };
}
