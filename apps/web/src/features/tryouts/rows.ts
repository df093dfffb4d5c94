import type {
  TryOutPlaceResponse,
  TryOutRankingResponse,
  TryOutRankingRow,
  TryOutResponse,
} from '@thudline/contracts';
import type { PlotPoint } from './pictures/tryOutPlotLayout';
import { positionWords, type LengthUnit } from './positionWords';

/** A place with what is told of it. */
export interface RankedPlace {
  place: TryOutPlaceResponse & { take: NonNullable<TryOutPlaceResponse['take']> };
  row: TryOutRankingRow;
  isCurrent: boolean;
  isWinner: boolean;
}

/** In the ranking's order. */
export function rankedPlaces(tryOut: TryOutResponse, { rows }: TryOutRankingResponse): RankedPlace[] {
  return rows.flatMap((row) => {
    const place = tryOut.places.find(({ id }) => id === row.placeId);
    if (!place?.take) return [];
    return {
      place: { ...place, take: place.take },
      row,
      isCurrent: place.id === tryOut.currentPlaceId,
      isWinner: place.id === tryOut.winnerPlaceId,
    };
  });
}

/** In the order they were played, as far as there is a figure. */
export function plotPoints(tryOut: TryOutResponse, ranked: readonly RankedPlace[]): PlotPoint[] {
  return tryOut.places.flatMap(({ id }) => {
    const found = ranked.find(({ place }) => place.id === id);
    if (!found || found.row.value === null) return [];
    const { row, isCurrent, place } = found;
    return {
      id,
      value: row.value ?? 0,
      interval: row.interval95,
      position: tryOut.unit === 'label' ? null : place.position,
      mark: row.standing === 'best' ? 'best' : isCurrent ? 'now' : 'plain',
      asGood: row.standing === 'best' || row.standing === 'as-good',
    };
  });
}

/** "100 cm", or "take 18" where nothing was written. */
export const placeName = (
  place: TryOutPlaceResponse,
  tryOut: Pick<TryOutResponse, 'unit'>,
  lengthUnit: LengthUnit,
): string => positionWords(place, tryOut.unit, lengthUnit) ?? `take ${place.take?.number ?? ''}`.trim();

/** "takes 16 to 20", "takes 3, 7 and 9", "take 4". */
export function takesWords(tryOut: Pick<TryOutResponse, 'places'>): string {
  const numbers = tryOut.places.flatMap(({ take }) => take?.number ?? []).sort((a, b) => a - b);
  const [first, last] = [numbers[0], numbers.at(-1)];
  if (first === undefined || last === undefined) return 'no takes yet';
  if (numbers.length === 1) return `take ${first}`;
  if (last - first === numbers.length - 1 && numbers.length > 2) return `takes ${first} to ${last}`;
  if (numbers.length > 5) return `${numbers.length} takes`;
  return `takes ${numbers.slice(0, -1).join(', ')} and ${last}`;
}

export const reasonWords: Record<NonNullable<TryOutRankingRow['reason']>, string> = {
  'too-few-hits': 'can’t tell: fewer than six hits',
  'strength-unmatched': 'can’t tell: played at another strength',
  'cannot-tell': 'can’t tell on this take',
  'not-measured': 'measure it again to rank it',
};
