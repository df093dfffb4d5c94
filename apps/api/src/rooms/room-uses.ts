import { EntityManager } from '@mikro-orm/postgresql';
import { RoomResponse } from '@thudline/contracts';
import { Injectable } from '@nestjs/common';

export type RoomUse = Pick<RoomResponse, 'takeCount' | 'firstTakeAt' | 'lastTakeAt' | 'changeCount'>;

const uses = `
  select r.id, t.count as "takeCount", t.first as "firstTakeAt", t.last as "lastTakeAt",
    (select count(*)::int from room_change c where c.room_id = r.id) as "changeCount"
  from room r left join lateral (
    select count(*)::int as count, min(recorded_at) as first, max(recorded_at) as last
    from take where room_id = r.id and deleted_at is null) t on true
  where r.owner_id = ?`;

interface UseRow extends Pick<RoomUse, 'takeCount' | 'changeCount'> {
  id: string;
  firstTakeAt: string | Date | null;
  lastTakeAt: string | Date | null;
}

const isoOrNull = (at: string | Date | null) => at && new Date(at).toISOString();

/** How much was recorded in the rooms of a player, and changed about them. */
@Injectable()
export class RoomUses {
  constructor(private readonly em: EntityManager) {}

  /** @returns by room id */
  async ofOwner(ownerId: string): Promise<Map<string, RoomUse>> {
    const rows = await this.em.getConnection().execute<UseRow[]>(uses, [ownerId]);
    return new Map(
      rows.map(({ id, takeCount, changeCount, firstTakeAt, lastTakeAt }) => [
        id,
        { takeCount, changeCount, firstTakeAt: isoOrNull(firstTakeAt), lastTakeAt: isoOrNull(lastTakeAt) },
      ]),
    );
  }
}
