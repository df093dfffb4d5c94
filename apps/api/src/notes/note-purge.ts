import { EntityManager } from '@mikro-orm/postgresql';
import { restorableSince } from '../takes/deleted-takes';

/** Removed notes go for good once nobody can bring them back; one that has answers goes with the last of them. */
export async function purgeNotes(em: EntityManager, now: Date): Promise<void> {
  const before = restorableSince(now);
  const connection = em.getConnection();
  await connection.execute(
    `delete from note where deleted_at < ? and not exists
       (select 1 from note answer where answer.parent_id = note.id and answer.deleted_at is null)`,
    [before],
  );
  await connection.execute(
    `update note set body = '', guest_name = null, edited_at = null where deleted_at < ? and body <> ''`,
    [before],
  );
}
