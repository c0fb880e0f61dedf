import { expect, it } from 'vitest';
import type { WorkerMessage } from '../protocol/messages';
import { EngineSlot } from './engine-slot';
import type { WorkerPort } from './worker-port';

/** A worker played by hand: it starts when told, and answers each job at once unless it is mute. */
class PlayedWorker implements WorkerPort {
  mute = false;
  terminated = false;
  say: (message: WorkerMessage) => void = () => {};
  fail: (words: string) => void = () => {};

  post({ id }: { readonly id: number }): void {
    if (!this.mute) queueMicrotask(() => this.say({ type: 'done', id, raw: null, errors: [] }));
  }
  listen(handlers: { message(message: WorkerMessage): void; failure(words: string): void }): void {
    this.say = handlers.message;
    this.fail = handlers.failure;
  }
  terminate(): Promise<void> {
    this.terminated = true;
    return Promise.resolve();
  }
  hold(): void {}
}

function playedSlot(runsPerWorker = 1000, startsAlone = true) {
  const workers: PlayedWorker[] = [];
  const slot = new EngineSlot(() => {
    const worker = new PlayedWorker();
    workers.push(worker);
    if (startsAlone || workers.length === 1) queueMicrotask(() => worker.say({ type: 'ready' }));
    return worker;
  }, { startMs: 50, runsPerWorker });
  return { slot, workers };
}

it('runs on one worker for as long as it is well', async () => {
  const { slot, workers } = playedSlot();
  for (let run = 0; run < 20; run += 1) expect((await slot.run('deck', 100)).ending).toBe('done');
  expect(workers).toHaveLength(1);
});

it('keeps running on a worker that has run its share until the spare is ready, then changes over', async () => {
  const { slot, workers } = playedSlot(2, false);
  for (let run = 0; run < 5; run += 1) expect((await slot.run('deck', 100)).ending).toBe('done');
  expect(workers.map(({ terminated }) => terminated)).toEqual([false, false]);
  workers[1]?.say({ type: 'ready' });
  await Promise.resolve();
  expect((await slot.run('deck', 100)).ending).toBe('done');
  expect(workers.map(({ terminated }) => terminated).slice(0, 2)).toEqual([true, false]);
});

it('replaces a worker that does not answer', async () => {
  const { slot, workers } = playedSlot();
  await slot.start();
  (workers[0] as PlayedWorker).mute = true;
  expect((await slot.run('deck', 20)).ending).toBe('timeout');
  expect(workers[0]?.terminated).toBe(true);
  expect((await slot.run('deck', 100)).ending).toBe('done');
  expect(workers).toHaveLength(2);
});

it('replaces a worker that died while nobody waited for it', async () => {
  const { slot, workers } = playedSlot();
  await slot.run('deck', 100);
  workers[0]?.fail('out of memory');
  expect((await slot.run('deck', 100)).ending).toBe('done');
  expect(workers).toHaveLength(2);
});

it('says when a worker does not start, and tries again at the next run', async () => {
  const { slot, workers } = playedSlot(1000, false);
  await slot.run('deck', 100);
  workers[0]?.fail('gone');
  expect((await slot.run('deck', 100)).ending).toBe('timeout');
  const again = slot.run('deck', 100);
  await Promise.resolve();
  workers[2]?.say({ type: 'ready' });
  expect((await again).ending).toBe('done');
});

it('refuses every run once it has ended', async () => {
  const { slot, workers } = playedSlot();
  await slot.start();
  (workers[0] as PlayedWorker).mute = true;
  const under = slot.run('deck', 1_000);
  await Promise.resolve();
  await slot.end();
  expect((await under).ending).toBe('crash');
  expect((await slot.run('deck', 100)).ending).toBe('crash');
});
