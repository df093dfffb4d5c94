import { tryOutLimits } from '@thudline/contracts';
import { comparePath } from '../compare/takeWords';
import { oldestFirst, type ChosenTake } from './chosenTakes';

/** A page that takes chosen takes further, as a button of the bar. */
export interface ChosenPlace {
  words: string;
  /** Null where these takes can't go there. */
  address: (takes: readonly ChosenTake[]) => string | null;
}

/** Add a page here. */
const places: readonly ChosenPlace[] = [
  {
    words: 'Compare',
    address: (takes) => {
      const [before, after] = oldestFirst(takes);
      return takes.length === 2 ? comparePath(before.id, after.id) : null;
    },
  },
  {
    words: 'Make a try-out',
    address: (takes) =>
      takes.length >= tryOutLimits.fewestTakes && takes.length <= tryOutLimits.mostTakes
        ? `/tryouts/new?takes=${oldestFirst(takes)
            .map(({ id }) => id)
            .join(',')}`
        : null,
  },
];

/** Where these takes can go on to. */
export const chosenPlaces = (takes: readonly ChosenTake[]): { words: string; to: string }[] =>
  places.flatMap(({ words, address }) => {
    const to = address(takes);
    return to === null ? [] : [{ words, to }];
  });
