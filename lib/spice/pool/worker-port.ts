import type { EngineJob, WorkerMessage } from '../protocol/messages';

/** What the guard needs of a worker, whether of a browser or of Node. */
export interface WorkerPort {
  post(job: EngineJob): void;
  listen(handlers: { message(message: WorkerMessage): void; failure(words: string): void }): void;
  terminate(): Promise<void>;
  /** In Node a waiting worker must not keep the process alive, a working one must. */
  hold(working: boolean): void;
}

export type OpenWorker = () => WorkerPort;
