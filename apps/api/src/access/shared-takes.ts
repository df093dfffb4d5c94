import { EntityManager } from '@mikro-orm/postgresql';
import { Share } from '../shares/entities/share.entity';
import { added, nothing, TakeRights } from './take-rights';

/** A link to one take's sheet. */
const sheetRights = ({ canListen, canDownload, canNote }: Share): TakeRights => ({
  ...nothing,
  read: true,
  figures: true,
  listen: canListen,
  download: canDownload,
  note: canNote,
});

/** What speaks of several takes lets them be heard and opens none of their sheets; a comparison draws from their figures. */
const partRights = ({ canListen, otherTake }: Share): TakeRights => ({
  ...nothing,
  listen: canListen,
  figures: Boolean(otherTake),
});

export const isSheet = ({ take, otherTake }: Share): boolean => Boolean(take && !otherTake);

/** Which of these try-outs and rooms speak of the take: by its place, and by the log's changes. */
const speakOfTake = `
  select p.try_out_id as id from try_out_place p
    join try_out o on o.id = p.try_out_id and o.deleted_at is null
    join take t on t.owner_id = o.owner_id and t.upload_key = p.upload_key
  where t.id = ? and p.removed_at is null and p.try_out_id = any(?::uuid[])
  union
  select c.room_id from room_change_take ct join room_change c on c.id = ct.change_id
  where ct.take_id = ? and c.room_id = any(?::uuid[])`;

/** @param shares - open ones. @returns what they allow to be done with one take, added up */
export async function rightsThrough(em: EntityManager, shares: Share[], takeId: string): Promise<TakeRights> {
  const speaking = await thatSpeakOf(em, shares, takeId);
  return shares.reduce<TakeRights>((rights, share) => {
    const { take, otherTake, tryOut, room } = share;
    if (isSheet(share)) return take?.id === takeId ? added(rights, sheetRights(share)) : rights;
    const isAbout = [take?.id, otherTake?.id].includes(takeId);
    const speaks = isAbout || speaking.has(tryOut?.id ?? '') || speaking.has(room?.id ?? '');
    return speaks ? added(rights, partRights(share)) : rights;
  }, nothing);
}

async function thatSpeakOf(em: EntityManager, shares: Share[], takeId: string): Promise<Set<string>> {
  const tryOutIds = shares.flatMap(({ tryOut }) => tryOut?.id ?? []);
  const roomIds = shares.flatMap(({ room }) => room?.id ?? []);
  if (tryOutIds.length + roomIds.length === 0) return new Set();
  const values = [takeId, arrayText(tryOutIds), takeId, arrayText(roomIds)];
  const rows = await em.getConnection().execute<{ id: string }[]>(speakOfTake, values);
  return new Set(rows.map(({ id }) => id));
}

/** PostgreSQL's own spelling of an array; the ids come from the database. */
const arrayText = (ids: string[]) => `{${ids.join(',')}}`;
