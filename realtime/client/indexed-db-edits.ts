import type { EditScope, EditStore, RefusedEdit, WaitingEdit } from './edit-store';

const databaseName = 'holdoff-edits';
type Key = readonly (string | number)[];

function answerOf<T>(request: IDBRequest<T>): Promise<T> {
  return new Promise((resolve, reject) => {
    request.onsuccess = () => resolve(request.result);
    request.onerror = () => reject(request.error ?? new Error('The browser stored nothing.'));
  });
}

/** Resolves once the transaction is on disk; `durability: 'strict'` asks the browser not to answer earlier. */
function finished(transaction: IDBTransaction): Promise<void> {
  return new Promise((resolve, reject) => {
    transaction.oncomplete = () => resolve();
    transaction.onabort = () => reject(transaction.error ?? new Error('The browser stored nothing.'));
  });
}

/** Every key that starts with `prefix`: an array sorts after all strings and numbers. */
const startingWith = (prefix: Key) => IDBKeyRange.bound([...prefix], [...prefix, []]);
const prefixOf = ({ personId, circuitId }: EditScope): [string, string] => [personId, circuitId];

/** Edits kept in the browser's IndexedDB, which survives reloads, crashes and restarts. */
export class IndexedDbEdits implements EditStore {
  private constructor(private readonly db: IDBDatabase) {}

  /** @throws DOMException when the browser lets nothing be stored (private windows of some browsers) */
  static async open(): Promise<IndexedDbEdits> {
    const request = indexedDB.open(databaseName, 1);
    request.onupgradeneeded = () => {
      request.result.createObjectStore('waiting');
      request.result.createObjectStore('refused');
    };
    return new IndexedDbEdits(await answerOf(request));
  }

  put(scope: EditScope, instance: string, edit: WaitingEdit): Promise<void> {
    const work = this.begin();
    work.waiting.put(edit, [...prefixOf(scope), instance, edit.clientSeq]);
    return work.end();
  }

  removeUpTo(scope: EditScope, instance: string, clientSeq: number): Promise<void> {
    const work = this.begin();
    const prefix = [...prefixOf(scope), instance];
    work.waiting.delete(IDBKeyRange.bound([...prefix, 0], [...prefix, clientSeq]));
    return work.end();
  }

  refuse(scope: EditScope, instance: string, clientSeqs: readonly number[], refused: RefusedEdit): Promise<void> {
    const work = this.begin();
    work.refused.put(refused, [...prefixOf(scope), refused.id]);
    for (const clientSeq of clientSeqs) work.waiting.delete([...prefixOf(scope), instance, clientSeq]);
    return work.end();
  }

  async adopt(scope: EditScope, instance: string, isOpen: (instance: string) => boolean): Promise<WaitingEdit[]> {
    const work = this.begin();
    const range = startingWith(prefixOf(scope));
    const [keys, edits] = await Promise.all([answerOf(work.waiting.getAllKeys(range)), answerOf(work.waiting.getAll(range))]);
    const left = (edits as WaitingEdit[]).map((edit, index) => ({ edit, key: keys[index] as [string, string, string, number] }))
      .filter(({ key: [, , other] }) => other === instance || !isOpen(other))
      .sort((a, b) => a.edit.at - b.edit.at || a.key[3] - b.key[3]);
    const adopted = left.map(({ edit }, index) => ({ ...edit, clientSeq: index + 1 }));
    for (const { key } of left) work.waiting.delete(key);
    for (const edit of adopted) work.waiting.put(edit, [...prefixOf(scope), instance, edit.clientSeq]);
    await work.end();
    return adopted;
  }

  async refused(scope: EditScope): Promise<RefusedEdit[]> {
    const edits = await answerOf(this.begin().refused.getAll(startingWith(prefixOf(scope)))) as RefusedEdit[];
    return edits.sort((a, b) => a.at - b.at);
  }

  dropRefused(scope: EditScope, id: string): Promise<void> {
    const work = this.begin();
    work.refused.delete([...prefixOf(scope), id]);
    return work.end();
  }

  private begin(): { readonly waiting: IDBObjectStore; readonly refused: IDBObjectStore; end(): Promise<void> } {
    const transaction = this.db.transaction(['waiting', 'refused'], 'readwrite', { durability: 'strict' });
    const end = finished(transaction);
    return { waiting: transaction.objectStore('waiting'), refused: transaction.objectStore('refused'), end: () => end };
  }
}
