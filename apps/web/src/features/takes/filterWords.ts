import type { TakeFilter, TakeOrder, TakesQuery } from './takesQuery';
import { everyTake } from './takesQuery';

/** The words of the filter sentence, as they stand in it. */
export const filterWords: Record<TakeFilter, string> = {
  every: 'every take',
  good: 'good takes',
  clipped: 'clipped takes',
  hot: 'hot takes',
  low: 'low takes',
  'to-flip': 'takes to flip',
  noise: 'noisy takes',
  hum: 'takes that hum',
  'dc-offset': 'takes that sit off centre',
  flattened: 'takes that look squashed',
  overs: 'takes over full scale',
  dropouts: 'takes that seem to drop out',
  'late-start': 'takes whose files start apart',
  arrival: 'takes with an odd arrival',
  balance: 'takes with loud cymbals',
  files: 'takes with odd files',
  'cannot-tell': 'takes that can’t be told',
  deleted: 'deleted takes',
};

export const orderWords: Record<TakeOrder, string> = {
  newest: 'newest first',
  oldest: 'oldest first',
  'hardest-kick': 'hardest kick first',
  'fullest-low-end': 'fullest low end first',
};

const hasWords: Record<TakeFilter, string> = {
  every: 'is there',
  good: 'is good all through',
  clipped: 'has clipped',
  hot: 'is hot',
  low: 'is low',
  'to-flip': 'needs a flip',
  noise: 'is noisy',
  hum: 'hums',
  'dc-offset': 'sits off its centre',
  flattened: 'looks squashed',
  overs: 'goes over full scale',
  dropouts: 'seems to drop out',
  'late-start': 'has files that start apart',
  arrival: 'arrives oddly',
  balance: 'has loud cymbals',
  files: 'has odd files',
  'cannot-tell': 'is left open',
  deleted: 'is deleted',
};

/** Why the list is empty: "Nothing you tagged rug has clipped." */
export function nothingWords({ show, tag, setup, find }: TakesQuery): string {
  const subject = (tag ? `Nothing you tagged ${tag}` : 'Nothing you recorded') + withSetup(setup);
  const said = find.trim() ? ` that says “${find.trim()}”` : '';
  if (show === 'every' && said) return `${subject} says “${find.trim()}”.`;
  return `${subject}${said} ${hasWords[show]}.`;
}

const withSetup = (setup: string | null) => (setup ? ' with that setup' : '');

const capital = (words: string) => words.charAt(0).toUpperCase() + words.slice(1);

/** A wider sentence as a link: "Clipped takes tagged rug". */
export function queryWords({ show, tag, setup, find }: TakesQuery): string {
  const tagged = tag ? ` tagged ${tag}` : '';
  const said = find.trim() ? ` that ${show === 'every' ? 'says' : 'say'} “${find.trim()}”` : '';
  return capital(filterWords[show] + tagged + withSetup(setup) + said);
}

/** The same sentence with one thing less asked of a take; every take is not among them. */
export function widerQueries(query: TakesQuery): TakesQuery[] {
  const without: Partial<TakesQuery>[] = [];
  if (query.show !== 'every') without.push({ show: 'every' });
  if (query.tag) without.push({ tag: null });
  if (query.setup) without.push({ setup: null });
  if (query.find.trim()) without.push({ find: '' });
  if (without.length < 2) return [];
  return without.map((change) => ({ ...query, ...change, order: everyTake.order }));
}
