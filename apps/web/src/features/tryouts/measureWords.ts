import type { TryOutMeasure, TryOutPolarity, TryOutRankingResponse } from '@thudline/contracts';
import { decibels, number, signed } from '../../lib/format';

type Ranking = Pick<TryOutRankingResponse, 'measure' | 'also' | 'unit'>;

interface MeasureWords {
  name: string;
  /** Heads the column of values. */
  column: string;
  /** Above the plot. */
  axis: string;
  /** What lies at zero; null where zero says nothing and the axis may leave it out. */
  zero: string | null;
  /** "the kick gets 0.8 dB fuller" */
  better: (size: string) => string;
  /** "another position is 0.2 dB fuller" */
  than: string;
}

const measures: Record<TryOutMeasure, MeasureWords> = {
  'low-end': {
    name: 'low end',
    column: 'Low end',
    axis: 'dB of low end the overhead adds to the kick',
    zero: '0 = the kick alone',
    better: (size) => `the kick gets ${size} fuller`,
    than: 'fuller',
  },
  agreement: {
    name: 'agreement',
    column: 'Agreement',
    axis: 'how alike the two microphones move below 150 Hz',
    zero: '0 = nothing in common',
    better: (size) => `the two agree ${size} more`,
    than: 'more alike',
  },
  bleed: {
    name: 'bleed',
    column: 'Bleed',
    axis: 'dB of other drums in the kick microphone, lower is better',
    zero: null,
    better: (size) => `other drums get ${size} quieter in the kick microphone`,
    than: 'less bleed',
  },
  evenness: {
    name: 'evenness',
    column: 'Spread',
    axis: 'dB between softer and harder kicks, lower is better',
    zero: '0 = every kick alike',
    better: (size) => `the kick gets ${size} more even`,
    than: 'more even',
  },
  attack: {
    name: 'attack',
    column: 'Attack',
    axis: 'dB of click against weight in the kick microphone',
    zero: null,
    better: (size) => `the kick gets ${size} more click`,
    than: 'more click',
  },
};

export const measureName = (measure: TryOutMeasure | 'nothing'): string =>
  measure === 'nothing' ? 'nothing else' : measures[measure].name;

export const polarityName: Record<TryOutPolarity, string> = {
  'best-polarity': 'each take’s best polarity',
  'as-recorded': 'the takes as recorded',
  flipped: 'every overhead flipped',
};

/** Polarity plays no part in what is told of the kick microphone alone. */
export const usesPolarity = (measure: TryOutMeasure): boolean =>
  measure === 'low-end' || measure === 'agreement';

/** Of the measure that ranks, or of two together. */
export function rankingWords({ measure, also }: Ranking): MeasureWords {
  if (!also) return measures[measure];
  const names = `${measures[measure].name} and ${measures[also].name}`;
  return {
    name: names,
    column: 'Together',
    axis: `${names} together, in steps worth mentioning`,
    zero: null,
    better: (size) => `${names} together get ${size} better`,
    than: 'better',
  };
}

const digits = ({ unit }: Pick<Ranking, 'unit'>) => (unit === '' ? 2 : 1);

/** "+1.9", for a plot whose axis has the unit. */
export const shortValue = (value: number, ranking: Ranking): string =>
  ranking.measure === 'evenness' && !ranking.also
    ? number(value, digits(ranking))
    : signed(value, digits(ranking));

/** "+1.9 dB", "0.62", "+1.4 steps". */
export function valueWords(value: number, ranking: Ranking): string {
  return [shortValue(value, ranking), ranking.unit].filter(Boolean).join(' ');
}

/** "0.8 dB", without a sign. */
export function sizeWords(difference: number, ranking: Ranking): string {
  const size = Math.abs(difference);
  if (ranking.unit === 'dB') return decibels(size);
  return ranking.unit === '' ? number(size, 2) : `${number(size, 1)} steps`;
}
