import { sql, type SQL } from 'drizzle-orm';
import type { Database } from '../client';
import { updateChecksum } from '../queries/room-checksum';
import { grantStands, readRoomGrant } from '../queries/room-grant';
import { rtContributor, rtRoom, rtUpdate } from '../schema/room';

export interface RowActor {
  readonly personId: string;
  readonly sessionId: string | null;
  /** The grant under which the edit was let in; it must still stand at the commit. */
  readonly grantVersion: string;
}

export interface RowToAppend {
  readonly instanceId: string;
  readonly clientSeq: number;
  readonly actor: RowActor;
  readonly electrical: boolean;
  readonly bytes: Uint8Array;
}

export type AppendOutcome =
  /** Every row is committed; the first has seq `headSeq + 1`. */
  | { readonly kind: 'committed' }
  /** Nothing was written: these actors' grants changed. Split the batch and go on with the others. */
  | { readonly kind: 'refused'; readonly actors: readonly RowActor[] }
  /** Nothing was written: the head is not where the caller thinks, or the room is quarantined or gone. */
  | { readonly kind: 'moved' };

/** Key of an actor; two rows with one key share a grant check. */
export const rowActorKey = (actor: RowActor) => `${actor.personId} ${actor.sessionId ?? ''} ${actor.grantVersion}`;

/**
 * Appends rows to a room's log in one transaction, at `headSeq + 1` and up: all or none. Every actor's grant is looked at under
 * a lock inside it, so that no row is committed after the commit that took the actor's right away.
 * @throws the driver's error when the database fails; whether a COMMIT that was under way took place is then unknown
 */
export async function appendRows(db: Database, roomId: string, headSeq: number, rows: readonly RowToAppend[]): Promise<AppendOutcome> {
  const actors = [...new Map(rows.map(({ actor }) => [rowActorKey(actor), actor])).values()];
  const granted = sql.join(actors.map((actor) => sql`and ${grantStands(roomId, actor, actor.grantVersion)} = 1`), sql` `);
  // One round trip and one flush for each batch: what people wait for between a stroke and its acknowledgement.
  const answer = await db.execute(sql`begin not atomic
    declare exit handler for sqlexception begin rollback; resignal; end;
    start transaction;
    update ${rtRoom} set head_seq = ${headSeq + rows.length} where room_id = ${roomId} and head_seq = ${headSeq}
      and quarantined_at is null and tombstoned_at is null ${granted};
    if row_count() = 1 then
      ${insertRows(roomId, headSeq, rows)};
      ${insertContributors(roomId, headSeq, rows)}
      commit;
      select 1 as committed;
    else
      rollback;
    end if;
  end`) as unknown as [unknown];
  if (Array.isArray(answer[0])) return { kind: 'committed' };
  const refused: RowActor[] = [];
  for (const actor of actors) {
    if ((await readRoomGrant(db, roomId, actor))?.version !== actor.grantVersion) refused.push(actor);
  }
  return refused.length > 0 ? { kind: 'refused', actors: refused } : { kind: 'moved' };
}

const list = (values: readonly SQL[]) => sql.join([...values], sql`, `);

function insertRows(roomId: string, headSeq: number, rows: readonly RowToAppend[]): SQL {
  const values = rows.map(({ instanceId, clientSeq, actor: { personId: actorId, sessionId }, electrical, bytes }, index) => {
    const seq = headSeq + 1 + index;
    const sha256 = updateChecksum(roomId, { seq, instanceId, clientSeq, actorId, sessionId, electrical, bytes });
    return sql`(${roomId}, ${seq}, ${instanceId}, ${clientSeq}, ${actorId}, ${sessionId}, ${electrical}, ${Buffer.from(bytes)}, ${sha256})`;
  });
  return sql`insert into ${rtUpdate} (room_id, seq, instance_id, client_seq, actor_id, session_id, electrical, bytes, sha256)
    values ${list(values)}`;
}

/** Who made an electrical change, with the first seq of it. */
function insertContributors(roomId: string, headSeq: number, rows: readonly RowToAppend[]): SQL {
  const first = new Map<string, number>();
  rows.forEach(({ actor, electrical }, index) => {
    if (electrical && !first.has(actor.personId)) first.set(actor.personId, headSeq + 1 + index);
  });
  if (first.size === 0) return sql``;
  const values = [...first].map(([personId, seq]) => sql`(${roomId}, ${personId}, ${seq})`);
  return sql`insert ignore into ${rtContributor} (room_id, person_id, first_seq) values ${list(values)};`;
}
