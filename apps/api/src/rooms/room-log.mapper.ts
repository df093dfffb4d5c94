import { RoomChangeResponse, TakeOfRoom } from '@thudline/contracts';
import { photoResponseOf } from '../photos/photos.mapper';
import { Take } from '../takes/entities/take.entity';
import { RoomChange } from './entities/room-change.entity';
import { noSides, Sides } from './room-change-sides';
import { ToldChange } from './room-comparisons';

interface WholeChange {
  /** With its photo. */
  change: RoomChange;
  number: number;
  sides: Sides | undefined;
  told: ToldChange | undefined;
  /** Whether its sides were compared, as far as they could be. */
  isCompared: boolean;
}

export function roomChangeResponseOf({
  change,
  number,
  sides,
  told,
  isCompared,
}: WholeChange): RoomChangeResponse {
  const { before, after } = sides ?? noSides();
  const { id, happenedOn, rank, what, category, place, cost, note, photo } = change;
  const isTold = isCompared || before.length === 0 || after.length === 0;
  const { figures, caveats, ...did } = told ?? notTold({ before, after });
  return {
    id,
    number,
    happenedOn,
    rank,
    what,
    category,
    place: place ?? null,
    cost,
    note,
    before: before.map(takeOfRoom),
    after: after.map(takeOfRoom),
    isTold,
    did,
    caveats: [...caveats],
    figures: [...figures],
    photo: photo ? photoResponseOf(photo.unwrap()) : null,
  };
}

const takeOfRoom = ({ id, number, title }: Take): TakeOfRoom => ({ id, number, title });

export const choosableTakeOf = (take: Take) => ({
  ...takeOfRoom(take),
  recordedAt: take.recordedAt.toISOString(),
});

function notTold({ before, after }: Sides): ToldChange {
  const nothing = { status: 'cannot-tell' as const, figures: [], caveats: [] };
  const last = before.at(-1);
  if (!last) return { ...nothing, strong: 'No take before it.', rest: 'There is nothing to compare with.' };
  if (after.length === 0) {
    const rest = `Record one the way you recorded take ${last.number}, and it shows here.`;
    return { ...nothing, strong: 'No take since then.', rest };
  }
  return { ...nothing, strong: 'Not measured yet.', rest: 'It shows here once both sides are.' };
}
