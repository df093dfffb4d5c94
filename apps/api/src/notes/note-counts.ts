import { EntityManager } from '@mikro-orm/postgresql';

export interface NoteCount {
  notes: number;
  /** Of them, those by others since the player looked last. */
  newNotes: number;
}

const counted = `
  select note.take_id as "takeId", count(*)::int as notes,
    count(*) filter (
      where note.author_id is distinct from ? and note.created_at > coalesce(mark.read_at, '-infinity')
    )::int as "newNotes"
  from note
  left join read_mark mark on mark.take_id = note.take_id and mark.user_id = ?
  where note.take_id = any(?::uuid[]) and note.deleted_at is null
  group by note.take_id`;

/** @returns for each of the player's takes that has notes how many, in one query */
export async function noteCounts(
  em: EntityManager,
  playerId: string,
  takeIds: string[],
): Promise<Map<string, NoteCount>> {
  const values = [playerId, playerId, `{${takeIds.join(',')}}`];
  const rows = await em.getConnection().execute<({ takeId: string } & NoteCount)[]>(counted, values);
  return new Map(rows.map(({ takeId, notes, newNotes }) => [takeId, { notes, newNotes }]));
}
