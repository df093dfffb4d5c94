import { ListTakesRequest, topicFilters, UserSettings } from '@thudline/contracts';
import { restorableSince } from './deleted-takes';
import { parseCursor } from './take-cursor';

/** A condition, or an order, with the values for its question marks. */
export interface Sql {
  text: string;
  values: unknown[];
}

type TopicFilter = (typeof topicFilters)[number];

const plain = (text: string): Sql => ({ text, values: [] });
const roles = ['kick', 'overhead'] as const;
type Role = (typeof roles)[number];

/** As in the findings on level and noise; a spec holds the two against each other. */
const lowWatchDbfs = -18;
const noiseWatchDbfs = -60;

const hot = (role: Role, { target }: UserSettings): Sql => ({
  text: `r.${role}_peak_dbfs > ?`,
  values: [target.highDbfs],
});
const low = (role: Role, { target }: UserSettings): Sql => ({
  text: `r.${role}_peak_dbfs < ?`,
  values: [target.lowDbfs],
});
/** Low, and so low that the finding says so. */
const tooLow = (role: Role, settings: UserSettings): Sql =>
  all(
    low(role, settings),
    any(
      { text: `r.${role}_peak_dbfs < ?`, values: [lowWatchDbfs] },
      {
        text: `r.${role}_noise_dbfs + (? - r.${role}_peak_dbfs) > ?`,
        values: [settings.target.aimDbfs, noiseWatchDbfs],
      },
    ),
  );
const noisy = (role: Role): Sql => ({ text: `r.${role}_noise_dbfs > ?`, values: [noiseWatchDbfs] });
const clipped = plain('(r.kick_clipped or r.overhead_clipped)');
/** The list's word of a take names these before it says anything good. */
const named = plain(`r.topics && array['late-start', 'dropouts', 'flattened', 'hum']`);

/** Good is what the list says a good word of: nothing clipped, hot, too low, noisy, humming, broken or unsure. */
function good(settings: UserSettings): Sql {
  const faults = roles.flatMap((role) => [hot(role, settings), tooLow(role, settings), noisy(role)]);
  return all(plain(`r.adding_up = 'good'`), not(clipped), not(named), ...faults.map(not));
}

/** @returns which takes fit the sentence "Show … tagged … with setup …", and hold the words looked for */
export function fits(request: ListTakesRequest, ownerId: string, settings: UserSettings): Sql {
  const { show, tag, setup, find } = request;
  const parts = [{ text: 't.owner_id = ?', values: [ownerId] }, shown(show, settings)];
  if (tag !== undefined) parts.push({ text: 't.tags @> array[?]::text[]', values: [tag] });
  if (setup !== undefined) parts.push({ text: 't.setup_id = ?', values: [setup] });
  for (const word of (find ?? '').split(/\s+/).filter(Boolean)) parts.push(holds(word));
  return all(...parts);
}

function shown(show: ListTakesRequest['show'], settings: UserSettings): Sql {
  if (show === 'deleted') return { text: 't.deleted_at > ?', values: [restorableSince()] };
  const there = plain('t.deleted_at is null');
  switch (show) {
    case 'every':
      return there;
    case 'good':
      return all(there, good(settings));
    case 'clipped':
      return all(there, clipped);
    case 'hot':
      return all(there, any(...roles.map((role) => hot(role, settings))));
    case 'low':
      return all(there, any(...roles.map((role) => low(role, settings))));
    case 'to-flip':
      return all(there, plain(`r.adding_up = 'fix'`));
    case 'cannot-tell':
      return all(there, plain(`r.adding_up = 'cannot-tell'`));
    default:
      return all(there, { text: 'r.topics @> array[?]::text[]', values: [show satisfies TopicFilter] });
  }
}

/** Every word has to be somewhere; `%` and `_` are letters like any other. */
function holds(word: string): Sql {
  const like = `%${word.replace(/[\\%_]/g, '\\$&')}%`;
  return { text: `concat_ws(' ', t.title, t.note, r.says) ilike ?`, values: [like] };
}

interface Order {
  /** What the list is sorted by. */
  key: string;
  /** The key as the number that a cursor holds, and back. */
  told: (key: string) => string;
  given: string;
  direction: 'asc' | 'desc';
}

const asTime = {
  key: 't.recorded_at',
  told: (key: string) => `(extract(epoch from ${key}) * 1000)::float8`,
  given: 'to_timestamp(?::float8 / 1000)',
};
const asFigure = (key: string) => ({ key, told: (told: string) => told, given: '?::float8' });
/** A clipped hit was harder than any that can be measured; takes without a figure stand at the end. */
const orders: Record<ListTakesRequest['order'], Order> = {
  newest: { ...asTime, direction: 'desc' },
  oldest: { ...asTime, direction: 'asc' },
  'hardest-kick': {
    ...asFigure('case when r.kick_clipped then 1000 else coalesce(r.kick_peak_dbfs, -1000) end'),
    direction: 'desc',
  },
  'fullest-low-end': { ...asFigure('coalesce(r.low_end_db, -1000)'), direction: 'desc' },
};

export interface TakeListQuery {
  ids: Sql;
  count: Sql;
}

/** One page of ids with their places, by keyset, and how many fit in all. */
export function takeListQuery(
  request: ListTakesRequest,
  ownerId: string,
  settings: UserSettings,
): TakeListQuery {
  const from = `from take t left join report r on r.measurement_id = t.current_report_id`;
  const fitting = fits(request, ownerId, settings);
  const order = orders[request.order];
  const { key, told, direction } = order;
  const page = all(fitting, below(request.cursor, order));
  return {
    ids: {
      text: `select t.id, ${told(key)} as place ${from} where ${page.text}
        order by ${key} ${direction}, t.id ${direction} limit ?`,
      values: [...page.values, request.limit + 1],
    },
    count: { text: `select count(*)::int as total ${from} where ${fitting.text}`, values: fitting.values },
  };
}

function below(cursor: string | undefined, { key, given, direction }: Order): Sql {
  if (!cursor) return plain('true');
  const { place, id } = parseCursor(cursor);
  const sign = direction === 'desc' ? '<' : '>';
  return { text: `(${key}, t.id) ${sign} (${given}, ?::uuid)`, values: [place, id] };
}

function joined(word: 'and' | 'or', parts: Sql[]): Sql {
  return {
    text: `(${parts.map((part) => part.text).join(` ${word} `)})`,
    values: parts.flatMap((part) => part.values),
  };
}
const all = (...parts: Sql[]) => joined('and', parts);
const any = (...parts: Sql[]) => joined('or', parts);
/** What isn't known counts as not so. */
const not = ({ text, values }: Sql): Sql => ({ text: `(${text}) is not true`, values });
