import { queryParams, type TakesQuery } from './takesQuery';

/** Where in the list a page lies; kept in the address, so that back and reload find it again. */
export interface PagePlace {
  /** Null: the first page. */
  cursor: string | null;
  /** Number of the first row, from 1. A keyset cursor does not know it, so it travels along. */
  firstRow: number;
}

export function pagePlace(params: URLSearchParams): PagePlace {
  const cursor = params.get('after');
  const firstRow = Number(params.get('from'));
  if (!cursor) return { cursor: null, firstRow: 1 };
  return { cursor, firstRow: Number.isInteger(firstRow) && firstRow > 1 ? firstRow : 1 };
}

/** The address of the page after this one. */
export function pageAfter(
  query: TakesQuery,
  { nextCursor, place, shownRows }: { nextCursor: string; place: PagePlace; shownRows: number },
): string {
  const params = queryParams(query);
  params.set('after', nextCursor);
  params.set('from', String(place.firstRow + shownRows));
  return `/takes?${params.toString()}`;
}

/** "1–11 of 15"; "15 of 15" for a single row. */
export function rangeWords({ firstRow }: PagePlace, shownRows: number, total: number): string {
  const lastRow = firstRow + shownRows - 1;
  return lastRow === firstRow ? `${firstRow} of ${total}` : `${firstRow}–${lastRow} of ${total}`;
}
