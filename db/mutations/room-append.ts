import { sql, type SQL } from 'drizzle-orm';
import type { Database } from '../client';
import { updateChecksum } from '../queries/room-checksum';
import { grantStands } from '../queries/room-grant';
import { rtContributor, rtInstance, rtRoom, rtUpdate } from '../schema/room';

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
 * Appends rows to a room's log in one transaction, at `headSeq + 1` and up: all or none. Every actor's grant is read under
 * a lock inside it, so that no row is committed after the commit that took the actor's right away.
 * @throws the driver's error when the database fails; whether a COMMIT that was under way took place is then unknown
 */
export async function appendRows(db: Database, roomId: string, headSeq: number, rows: readonly RowToAppend[]): Promise<AppendOutcome> {
  const actors = [...new Map(rows.map(({ actor }) => [rowActorKey(actor), actor])).values()];
  // One round trip and one flush for each batch: what people wait for between a stroke and its acknowledgement.
  const answer = await db.execute(sql`begin not atomic
    declare refused varchar(1000) default '';
    declare exit handler for sqlexception begin rollback; resignal; end;
    start transaction;
    ${sql.join(actors.map((actor, index) => refusalOf(roomId, actor, index)), sql` `)}
    if refused <> '' then
      rollback;
      select 'refused' as kind, refused as refused;
    else
      update ${rtRoom} set ${column(rtRoom.headSeq)} = ${headSeq + rows.length} where ${rtRoom.roomId} = ${roomId}
        and ${rtRoom.headSeq} = ${headSeq} and ${rtRoom.quarantinedAt} is null and ${rtRoom.tombstonedAt} is null;
      if row_count() <> 1 then
        rollback;
        select 'moved' as kind;
      else
        ${inserts(roomId, headSeq, rows)}
        commit;
        select 'committed' as kind;
      end if;
    end if;
  end`) as unknown as [readonly (readonly AnswerRow[])[]];
  const row = answer[0].find(Array.isArray)?.[0] as AnswerRow | undefined;
  if (row?.kind === 'refused') return { kind: 'refused', actors: row.refused.trim().split(' ').flatMap((index) => actors[Number(index)] ?? []) };
  if (row?.kind === 'moved' || row?.kind === 'committed') return { kind: row.kind };
  throw new Error('The database did not say what became of the rows.');
}

type AnswerRow = { readonly kind: 'committed' } | { readonly kind: 'moved' } | { readonly kind: 'refused'; readonly refused: string };

const column = ({ name }: { readonly name: string }) => sql.identifier(name);

function refusalOf(roomId: string, actor: RowActor, index: number): SQL {
  const stands = grantStands(roomId, actor.personId, actor.sessionId, actor.grantVersion);
  return sql`if ${stands} = 0 then set refused = concat(refused, ${`${index} `}); end if;`;
}

/** The rows, how far each browser copy is, and who has made an electrical change. */
function inserts(roomId: string, headSeq: number, rows: readonly RowToAppend[]): SQL {
  const stored = rows.map((row, index) => ({
    seq: headSeq + 1 + index, instanceId: row.instanceId, clientSeq: row.clientSeq, actorId: row.actor.personId,
    sessionId: row.actor.sessionId, electrical: row.electrical, bytes: row.bytes,
  }));
  const list = (values: readonly SQL[]) => sql.join([...values], sql`, `);
  const updates = stored.map((row) => sql`(${roomId}, ${row.seq}, ${row.instanceId}, ${row.clientSeq}, ${row.actorId}, ${row.sessionId},
    ${row.electrical}, ${Buffer.from(row.bytes)}, ${updateChecksum(roomId, row)})`);
  const progress = [...new Map(stored.map((row) => [row.instanceId, row])).values()]
    .map((row) => sql`(${roomId}, ${row.instanceId}, ${row.actorId}, ${row.clientSeq}, ${row.seq})`);
  const contributors = [...new Map(stored.filter((row) => row.electrical).reverse().map((row) => [row.actorId, row.seq]))]
    .map(([personId, seq]) => sql`(${roomId}, ${personId}, ${seq})`);
  return sql`insert into ${rtUpdate} (room_id, seq, instance_id, client_seq, actor_id, session_id, electrical, bytes, sha256)
      values ${list(updates)};
    insert into ${rtInstance} (room_id, instance_id, person_id, last_client_seq, last_seq) values ${list(progress)}
      on duplicate key update last_client_seq = values(last_client_seq), last_seq = values(last_seq);
    ${contributors.length === 0 ? sql`` : sql`insert ignore into ${rtContributor} (room_id, person_id, first_seq) values ${list(contributors)};`}`;
}
