import { ulid } from 'ulid';
import { inTransaction } from '@/db/transaction';
import { writeAudit } from '@/db/mutations/audit';
import { endMakers, lockCircuit, nameMakers } from '@/db/mutations/circuits';
import { makersOf } from '@/db/queries/circuits';
import { membersAmong } from '@/db/queries/people';
import type { CircuitAccess } from '@/lib/access/gates';
import { stillMay } from '@/lib/access/still-may';
import { Problem } from '@/lib/errors/problem';
import { entry, refuseArchived, type Act } from '@/lib/review/act';
import { rooms } from '@/lib/rooms/room-client';

/**
 * Sets who makes a circuit besides its poster, who always stays. Whoever is removed keeps counting as a contributor, and
 * their open sheet turns read-only at once. Throws 422 when somebody is not on the bench.
 */
export async function setMakers(act: Act, access: CircuitAccess, makers: readonly string[]): Promise<void> {
  const removed = await inTransaction(act.db, async (tx) => {
    refuseArchived(await lockCircuit(tx, access.circuit));
    await stillMay(tx, act.person.id, ['name makers'], access);
    const wanted = [...new Set([access.postedBy, ...makers])];
    const people = new Set((await membersAmong(tx, access.bench, wanted)).map(({ id }) => id));
    const strangers = makers.filter((id) => !people.has(id));
    if (strangers.length > 0) {
      throw new Problem('input-wrong', 'A maker is not on this bench.', { errors: strangers.map((id) => ({ path: `makers.${makers.indexOf(id)}`, message: 'Not on this bench.' })) });
    }
    const now = new Set((await makersOf(tx, [access.circuit])).map(({ personId }) => personId));
    const named = wanted.filter((id) => !now.has(id));
    const ended = [...now].filter((id) => !wanted.includes(id));
    await nameMakers(tx, access.circuit, named.map((personId) => ({ id: ulid(act.now.getTime()), personId })), act.now);
    await endMakers(tx, access.circuit, ended, act.now);
    if (named.length + ended.length > 0) await writeAudit(tx, entry(act, access, 'set the makers', { named, removed: ended }));
    return ended;
  });
  for (const personId of removed) await rooms().revoke({ personId, circuitId: access.circuit });
  await rooms().revoke({ circuitId: access.circuit });
}
