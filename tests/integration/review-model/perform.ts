import { and, eq } from 'drizzle-orm';
import { circuitGate, objectionGate, revisionGate, signOffGate, threadGate } from '@/lib/access/gates';
import { setMakers } from '@/lib/circuits/name-makers';
import { Problem } from '@/lib/errors/problem';
import type { Act } from '@/lib/review/act';
import { askForChanges } from '@/lib/review/ask-for-changes';
import { askForReview } from '@/lib/review/ask-for-review';
import { cutRevision } from '@/lib/review/cut-revision';
import { liftObjection } from '@/lib/review/lift-objection';
import { moveNote } from '@/lib/review/move-note';
import { signOff } from '@/lib/review/sign-off';
import { withdrawSignOff } from '@/lib/review/withdraw-sign-off';
import { openNote } from '@/lib/review/write-note';
import { memberships } from '@/db/schema/people';
import { revisions } from '@/db/schema/revisions';
import type { ApiWorld, TestPerson } from '../../support/api-world';
import { callerOf, changeValue, personOf } from '../../support/bench-with-circuit';
import { plan, type Action } from './model';

/** Ids that the product gave to what the model counts, in the order in which both made them. */
export interface Made { readonly revisions: string[]; readonly hashes: string[]; readonly signOffs: string[]; readonly objections: string[]; readonly threads: string[] }

export interface Stage {
  readonly world: ApiWorld;
  readonly bench: string;
  readonly circuit: string;
  readonly people: ReadonlyMap<string, TestPerson>;
  readonly made: Made;
}

/** Does an action through the product's use cases; answers as the model does. Ids of what it made go to `made`. */
export async function perform(stage: Stage, action: Action): Promise<string> {
  try {
    return await attempt(stage, action);
  } catch (error) {
    if (error instanceof Problem) return error.code;
    throw error;
  }
}

const said = (first: boolean): string => (first ? 'ok' : 'repeat');

async function attempt({ world, bench, circuit, people, made }: Stage, action: Action): Promise<string> {
  const { db } = world;
  const person = people.get(action.who) as TestPerson;
  const caller = callerOf(person);
  const act: Act = { db, person: personOf(person), requestId: 'model', now: new Date() };
  const revisionAccess = (index: number) => revisionGate(db, caller, made.revisions[index] ?? '');
  switch (action.act) {
    case 'role':
      await db.update(memberships).set({ role: action.role }).where(and(eq(memberships.benchId, bench), eq(memberships.personId, action.who)));
      return 'ok';
    case 'edit':
      await changeValue(world, person, circuit, action.value);
      return 'ok';
    case 'cut': {
      const { value, first } = await cutRevision(act, await circuitGate(db, caller, circuit), { note: '' });
      if (first) {
        made.revisions.push(value);
        const [row] = await db.select({ hash: revisions.contentHash }).from(revisions).where(eq(revisions.id, value));
        made.hashes.push(row?.hash ?? '');
      }
      return said(first);
    }
    case 'ask': return said((await askForReview(act, await revisionAccess(action.revision), { reviewers: [...action.reviewers] })).first);
    case 'sign': {
      const contentHash = action.foreignHash ? '0'.repeat(64) : made.hashes[action.revision] ?? '';
      const { value, first } = await signOff(act, await revisionAccess(action.revision), { holdPoint: plan[action.point]?.name ?? '', contentHash });
      if (first) made.signOffs.push(value);
      return said(first);
    }
    case 'withdraw':
      await withdrawSignOff(act, await signOffGate(db, caller, made.signOffs[action.signOff] ?? ''), action.reason ? { reason: 'r' } : {});
      return 'ok';
    case 'object': {
      const { value, first } = await askForChanges(act, await revisionAccess(action.revision), 'r');
      if (first) made.objections.push(value);
      return said(first);
    }
    case 'lift':
      await liftObjection(act, await objectionGate(db, caller, made.objections[action.objection] ?? ''), action.reason ? { reason: 'r' } : {});
      return 'ok';
    case 'note':
      made.threads.push((await openNote(act, await circuitGate(db, caller, circuit), { anchor: { kind: 'spot', x: 0, y: 0 }, body: 'n', mustAnswer: action.must })).value);
      return 'ok';
    case 'resolve': {
      const access = await threadGate(db, caller, made.threads[action.thread] ?? '');
      await moveNote(act, access, { status: 'resolved' });
      return 'ok';
    }
    case 'makers':
      await setMakers(act, await circuitGate(db, caller, circuit), action.makers);
      return 'ok';
  }
}
