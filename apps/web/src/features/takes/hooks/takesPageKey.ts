import { paths } from '@thudline/contracts';
import { everyTake, queryParams, type TakesQuery } from '../takesQuery';

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
