import { takeFilters, takeOrders } from '@thudline/contracts';

export type TakeFilter = (typeof takeFilters)[number];
export type TakeOrder = (typeof takeOrders)[number];

/** The filter sentence; kept in the address, so that back, reload and a bookmark find the same takes. */
export interface TakesQuery {
  show: TakeFilter;
  order: TakeOrder;
  tag: string | null;
  /** Id of the setup they were recorded with. */
  setup: string | null;
  find: string;
}

export const everyTake: TakesQuery = { show: 'every', order: 'newest', tag: null, setup: null, find: '' };

const uuid = /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/i;

/** What an address means; what it doesn't know reads as if it were not there. */
export function takesQuery(params: URLSearchParams): TakesQuery {
  return {
    show: takeFilters.find((each) => each === params.get('show')) ?? everyTake.show,
    order: takeOrders.find((each) => each === params.get('order')) ?? everyTake.order,
    tag: params.get('tag')?.slice(0, 30) || null,
    setup: params.get('setup')?.match(uuid)?.[0] ?? null,
    find: (params.get('find') ?? '').slice(0, 100),
  };
}

/** Only what differs from "every take, newest first", for the address and for the API alike. */
export function queryParams({ show, order, tag, setup, find }: TakesQuery): URLSearchParams {
  const params = new URLSearchParams();
  if (show !== everyTake.show) params.set('show', show);
  if (order !== everyTake.order) params.set('order', order);
  if (tag) params.set('tag', tag);
  if (setup) params.set('setup', setup);
  if (find.trim()) params.set('find', find.trim());
  return params;
}

export function takesAddress(query: TakesQuery): string {
  const params = queryParams(query).toString();
  return params ? `/takes?${params}` : '/takes';
}
