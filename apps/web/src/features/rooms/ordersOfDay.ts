import type { RoomChangeResponse } from '@thudline/contracts';

type Placed = Pick<RoomChangeResponse, 'id' | 'number' | 'rank' | 'happenedOn'>;

/** Changes of one day in another order, each with the rank that puts it there; absent where nothing stands on that side. */
export function ordersOfDay<Change extends Placed>(
  changes: readonly Change[],
  moved: Change,
): { earlier?: Ranked[]; later?: Ranked[] } {
  const day = changes
    .filter(({ happenedOn }) => happenedOn === moved.happenedOn)
    .sort((one, other) => one.number - other.number);
  const at = day.findIndex(({ id }) => id === moved.id);
  return {
    ...(at > 0 && { earlier: swapped(day, at - 1) }),
    ...(at >= 0 && at < day.length - 1 && { later: swapped(day, at) }),
  };
}

export interface Ranked {
  id: string;
  rank: number;
}

/** Only those whose rank has to change. */
function swapped(day: readonly Placed[], at: number): Ranked[] {
  const order = [...day.slice(0, at), day[at + 1], day[at], ...day.slice(at + 2)];
  return order.flatMap(({ id, rank }, place) => (rank === place ? [] : [{ id, rank: place }]));
}
