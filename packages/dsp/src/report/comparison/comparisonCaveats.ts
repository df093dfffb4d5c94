import type { ComparedFigure } from '../../measurements/comparing/comparedFigure';
import { comparedNames } from './comparedNames';
import type { ComparedPolarity } from './comparedPolarity';

/** Whether both preamps stood alike for both takes, as far as anything was noted. */
export type GainBetween = 'same' | 'changed' | 'unknown';

export interface ComparisonCaveat {
  readonly about: string;
  readonly text: string;
}

/**
 * Cautions about the comparison itself: what it leaves out, and what take would settle it.
 * @example
 * const compared = compareTakes({ before: facts, after: facts, gainKnownSame: false });
 * const sound = { likeness: 1, seen: 'as-before', hits: 8, turnedHits: 0 };
 * const polarity = comparedPolarity({ before: figures, after: figures, sound, notedFlip: false });
 * comparisonCaveats({ figures: compared, polarity, gain: 'unknown' }).length // 2
 */
export function comparisonCaveats({
  figures,
  polarity,
  gain,
}: {
  readonly figures: readonly ComparedFigure[];
  readonly polarity: ComparedPolarity;
  readonly gain: GainBetween;
}): ComparisonCaveat[] {
  const leftOut = (reason: string): string[] =>
    figures.filter((figure) => figure.reason === reason).map(({ key }) => comparedNames[key].label);
  return [
    ...contradicted(polarity),
    ...unmatched(leftOut('strength-unmatched'), gain),
    ...tooFew(leftOut('too-few-hits')),
  ];
}

function contradicted({ noted, seen }: ComparedPolarity): ComparisonCaveat[] {
  if (!noted || seen !== 'as-before') return [];
  const text =
    'A switch pressed on both microphones changes nothing between them. Look which one is pressed, and record one more take.';
  return [{ about: 'the flip', text }];
}

function unmatched(labels: readonly string[], gain: GainBetween): ComparisonCaveat[] {
  if (labels.length === 0) return [];
  const why =
    gain === 'changed'
      ? 'A preamp changed, so hits can’t be matched by strength.'
      : 'Nothing says whether the preamps were touched, so hits can’t be matched by strength.';
  const settles =
    gain === 'changed'
      ? 'record one more take without touching the preamps.'
      : 'note their gain in the setups of both takes.';
  return [{ about: 'matching', text: `${why} ${listed(labels)} left out: ${settles}` }];
}

function tooFew(labels: readonly string[]): ComparisonCaveat[] {
  if (labels.length === 0) return [];
  return [
    {
      about: 'hits',
      text: `${listed(labels)} left out: that needs six hits struck alike in each take. Record a check take to settle it.`,
    },
  ];
}

/** "Attack is", "Attack and evenness of kicks are", "Attack and 4 others are" */
function listed(labels: readonly string[]): string {
  const [first, second] = labels;
  const head = first.charAt(0).toUpperCase() + first.slice(1);
  if (labels.length === 1) return `${head} is`;
  return labels.length === 2 ? `${head} and ${second} are` : `${head} and ${labels.length - 1} others are`;
}
