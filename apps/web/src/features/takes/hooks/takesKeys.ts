import { paths } from '@thudline/contracts';
import { everyTake, queryParams, type TakesQuery } from '../takesQuery';

/** Every page of the list; a changed take can move rows from one page to the next. */
export const isTakesKey = (key: unknown) =>
  typeof key === 'string' && (key === paths.takes || key.startsWith(`${paths.takes}?`));

/** Everything that is known of one take: the take, its report, its pictures. */
export const isKeyOfTake = (takeId: string) => (key: unknown) =>
  typeof key === 'string' && (key === paths.take(takeId) || key.startsWith(`${paths.take(takeId)}/`));

interface Page {
  query?: TakesQuery;
  cursor?: string | null;
  limit?: number;
}

export function takesKey({ query = everyTake, cursor, limit }: Page = {}): string {
  const params = queryParams(query);
  if (cursor) params.set('cursor', cursor);
  if (limit) params.set('limit', String(limit));
  const text = params.toString();
  return text ? `${paths.takes}?${text}` : paths.takes;
}
