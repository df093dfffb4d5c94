import type { ProgressFigure } from '@thudline/contracts';
import { FEWEST_HITS, takeChange, worthSteps } from '@thudline/dsp';
import { decibels, number, plural, signedDecibels } from '../../lib/format';
import { figureWords, middleOf, type ProgressPoint } from './progressFigures';

const fewestTakes = 2 * FEWEST_HITS;

const words: Record<ProgressFigure, { more: string; less: string; now: (db: number) => string }> = {
  'level-spread': {
    more: 'Your kicks are less even than they were:',
    less: 'Your kicks are more even than they were:',
    now: (db) => `within ${decibels(db)}`,
  },
  'cymbals-over-drums': {
    more: 'Your cymbals are louder against the drums:',
    less: 'Your cymbals are quieter against the drums:',
    now: (db) => signedDecibels(db),
  },
  headroom: {
    more: 'Your hardest kicks leave more headroom:',
    less: 'Your hardest kicks leave less headroom:',
    now: (db) => decibels(db),
  },
};

/** The newer half of the takes against the older half, told as a change only where it surely is one. */
export function progressHead(
  points: readonly ProgressPoint[],
  figure: ProgressFigure,
): { strong: string; rest: string } {
  if (points.length < fewestTakes)
    return {
      strong: 'Too early to tell.',
      rest: `A change of ${figureWords[figure]} shows from ${fewestTakes} takes on; ${plural(points.length, 'take')} ${points.length === 1 ? 'tells' : 'tell'} it so far.`,
    };
  const values = points.map(({ value }) => value);
  const half = Math.floor(values.length / 2);
  const sides = { before: values.slice(0, half), after: values.slice(half) };
  const { change, clear } = takeChange(sides, worthSteps.peakDb);
  const { more, less, now } = words[figure];
  const [was, is] = [middleOf(sides.before), middleOf(sides.after)];
  if (!clear || change === null)
    return {
      strong: `No clear change in ${figureWords[figure]}:`,
      rest: `${now(is)} in your newer ${plural(sides.after.length, 'take')}, ${now(was)} before.`,
    };
  return {
    strong: change > 0 ? more : less,
    rest: `${now(is)} in your newer ${plural(sides.after.length, 'take')}, ${now(was)} before.`,
  };
}

/** For whoever can't see the picture. */
export function progressInWords(points: readonly ProgressPoint[], figure: ProgressFigure): string {
  const [first, last] = [points[0], points[points.length - 1]];
  return `${figureWords[figure]} of ${plural(points.length, 'take')}, from ${number(first.value, 1)} dB in take ${first.take.number} to ${number(last.value, 1)} dB in take ${last.take.number}.`;
}
