import type { ComparedFigure } from '@thudline/contracts';

/** What a comparison is about, whether it changed or not. */
const always: readonly ComparedFigure['key'][] = [
  'low-end',
  'hardest-kick',
  'cymbals-over-drums',
  'arrival',
  'noise-overhead',
  'evenness',
  'attack',
];

/** The rows that say something: what a comparison is about, and whatever changed clearly. */
export const shownFigures = (figures: readonly ComparedFigure[]): ComparedFigure[] =>
  figures.filter(({ key, clear }) => clear || always.includes(key));
