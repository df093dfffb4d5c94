import type { ChangeCategory, ListRoomChangesResponse, RoomChangeResponse } from '@thudline/contracts';

type RoomTake = ListRoomChangesResponse['takes'][number];

export interface ChangeDraft {
  what: string;
  happenedOn: string;
  category: ChangeCategory;
  cost: string;
  note: string;
  /** Null: by date. */
  before: string[] | null;
  after: string[] | null;
  placeX: string;
  placeY: string;
}

/** As it stands in the log; a new one is today's. */
export function changeDraftOf(change: RoomChangeResponse | null, today: Date): ChangeDraft {
  const text = (value: number | undefined) => (value === undefined ? '' : String(Number(value.toFixed(2))));
  return {
    what: change?.what ?? '',
    happenedOn: change?.happenedOn ?? today.toISOString().slice(0, 10),
    category: change?.category ?? 'other',
    cost: change?.cost ?? '',
    note: change?.note ?? '',
    before: change ? change.before.map(({ id }) => id) : null,
    after: change ? change.after.map(({ id }) => id) : null,
    placeX: text(change?.place?.xM),
    placeY: text(change?.place?.yM),
  };
}

const nearest = 5;

/** What is offered on each side of a day: its nearest takes, and those already chosen. */
export function offeredTakes(
  takes: readonly RoomTake[],
  { happenedOn, before, after }: Pick<ChangeDraft, 'happenedOn' | 'before' | 'after'>,
): { before: RoomTake[]; after: RoomTake[] } {
  const newestFirst = [...takes].sort((one, other) => other.recordedAt.localeCompare(one.recordedAt));
  const isBefore = ({ recordedAt }: RoomTake) => recordedAt.slice(0, 10) < happenedOn;
  const earlier = newestFirst.filter(isBefore).slice(0, nearest);
  const later = newestFirst.filter((take) => !isBefore(take)).slice(-nearest);
  const withChosen = (near: RoomTake[], chosen: string[] | null) =>
    newestFirst.filter((take) => near.includes(take) || chosen?.includes(take.id));
  return { before: withChosen(earlier, before), after: withChosen(later, after).reverse() };
}

/** The nearest of each side, as the server suggests them. */
export function suggestedTakes(
  takes: readonly RoomTake[],
  happenedOn: string,
): { before: string[]; after: string[] } {
  const offered = offeredTakes(takes, { happenedOn, before: null, after: null });
  return { before: offered.before.slice(0, 1).map(idOf), after: offered.after.slice(0, 1).map(idOf) };
}

const idOf = ({ id }: RoomTake) => id;
