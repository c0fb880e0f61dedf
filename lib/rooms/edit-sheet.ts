import { ulid } from 'ulid';
import type { CircuitId } from '@/db/authorized';
import type { Database } from '@/db/client';
import type { Person } from '@/lib/access/caller';
import { updateTowards } from '@/lib/document/encode-sheet';
import type { Sheet } from '@/lib/document/records';
import { Problem } from '@/lib/errors/problem';
import { readLiveSheet } from './live-sheet';
import { rooms } from './room-client';

/** Who edits: a person with the session they act in; the seed acts without one. */
export type Editor = Pick<Person, 'id'> & { readonly session?: { readonly id: string } };

const attempts = 8;
/** A Yjs update that says nothing: no structs, no deletions. */
const emptyUpdateBytes = 2;

/**
 * Changes a sheet as one edit of `editor`, through the realtime process as the one writer. `change` is worked out on the
 * committed sheet and worked out again when the head has moved meanwhile. Answers the seq after the commit.
 */
export async function editSheet(db: Database, circuit: CircuitId, editor: Editor, change: (sheet: Sheet) => Sheet | Promise<Sheet>): Promise<number> {
  const key = ulid();
  for (let attempt = 1; attempt <= attempts; attempt += 1) {
    const live = await readLiveSheet(db, circuit);
    const after = await change(live.sheet);
    const update = after === live.sheet ? null : updateTowards(live.bytes, () => after);
    if (update === null || update.length <= emptyUpdateBytes) return live.seq;
    const answer = await rooms().append({
      circuitId: circuit, actorId: editor.id, sessionId: editor.session?.id ?? null,
      update: Buffer.from(update).toString('base64'), baseSeq: live.seq, key: `${key}-${attempt}`,
    });
    switch (answer.kind) {
      case 'committed': return answer.seq;
      case 'sheet-moved': continue;
      case 'not-allowed': throw new Problem('not-allowed', 'Only the makers of this circuit can do this.');
      case 'not-found': throw new Problem('not-found');
      case 'refused': throw new Problem('input-wrong', answer.words);
      case 'unavailable': throw new Problem('unavailable', answer.words, { retryAfter: 2 });
    }
  }
  throw new Problem('sheet-moved', 'Others are changing this sheet faster than this edit can be placed.');
}
