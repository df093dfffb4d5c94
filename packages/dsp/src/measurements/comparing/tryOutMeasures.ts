import { dbAmplitude } from '../../decibel';
import { lowCorrelationOf, lowEndDb } from './lowEndOfHits';
import { FEWEST_HITS, worthSteps } from './takeChange';
import { lowEndSign, type KickHitTold, type TakeSide } from './takeSide';
import { minus, uncertain, uncertainIqr, uncertainMedian, type Uncertain } from './uncertain';

/** docs/measurements.md, 8. */
export type TryOutMeasure = 'low-end' | 'agreement' | 'bleed' | 'evenness' | 'attack';

/** How each take's overhead is played: by the polarity that gives more low end, as it was, or turned over. */
export type ChoiceRule = 'best-polarity' | 'as-recorded' | 'flipped';

/** As when two takes are compared. */
export type TryOutReason = 'too-few-hits' | 'strength-unmatched' | 'cannot-tell' | 'not-measured';

/** What a measure says of one take. */
export interface MeasuredTake {
  /** With a reason, shown but not ranked; null where there is none. */
  readonly figure: Uncertain | null;
  readonly hits: number;
  readonly reason: TryOutReason | null;
  readonly flipped: boolean;
}

interface ReadOptions {
  /** Kick hits about as hard as the other takes'. */
  readonly alike: readonly KickHitTold[];
  readonly choiceRule: ChoiceRule;
  readonly seed: number;
}

interface MeasureRule {
  readonly unit: 'dB' | '';
  readonly step: number;
  readonly higherIsBetter: boolean;
  readonly words: { readonly best: string; readonly worse: string };
  read(side: TakeSide, options: ReadOptions): MeasuredTake;
}

/** The measures a try-out is ranked by; steps without a source are our choice. */
export const tryOutMeasures: Readonly<Record<TryOutMeasure, MeasureRule>> = {
  'low-end': {
    unit: 'dB',
    step: worthSteps.lowEndDb.size,
    higherIsBetter: true,
    words: { best: 'fullest', worse: 'clearly thinner' },
    read: lowEnd,
  },
  agreement: {
    unit: '',
    step: 0.1,
    higherIsBetter: true,
    words: { best: 'agrees best', worse: 'clearly agrees less' },
    read: agreement,
  },
  bleed: {
    unit: 'dB',
    step: worthSteps.levelDb.size,
    higherIsBetter: false,
    words: { best: 'least bleed', worse: 'clearly more bleed' },
    read: bleed,
  },
  evenness: {
    unit: 'dB',
    step: worthSteps.levelDb.size,
    higherIsBetter: false,
    words: { best: 'most even', worse: 'clearly less even' },
    read: evenness,
  },
  attack: {
    unit: 'dB',
    step: worthSteps.levelDb.size,
    higherIsBetter: true,
    words: { best: 'most attack', worse: 'clearly less attack' },
    read: attack,
  },
};

/** The two added, levels matched, against the kick microphone alone. */
function lowEnd(side: TakeSide, { alike, choiceRule, seed }: ReadOptions): MeasuredTake {
  const hits = alike.length < FEWEST_HITS ? side.kicks : alike;
  const { matchGainDb } = side.pair.agreement;
  const flipped = isFlipped(side, choiceRule);
  if (matchGainDb === null) return { ...nothing(side), flipped };
  const gain = dbAmplitude(matchGainDb) * (flipped ? -1 : 1);
  return kickFigure(side, hits, {
    flipped,
    figure: () => uncertain(hits, { figure: (drawn) => lowEndDb(drawn, { gain, against: 'kick' }), seed }),
  });
}

function agreement(side: TakeSide, { choiceRule, seed }: ReadOptions): MeasuredTake {
  const flipped = isFlipped(side, choiceRule);
  const sign = flipped ? -1 : 1;
  return kickFigure(side, side.kicks, {
    flipped,
    figure: () => uncertain(side.kicks, { figure: (drawn) => sign * lowCorrelationOf(drawn), seed }),
  });
}

function bleed({ facts, pair }: TakeSide, { seed }: ReadOptions): MeasuredTake {
  const peaks = (kind: 'kick' | 'drum'): number[] =>
    facts.hits.filter((hit) => hit.kind === kind).flatMap((hit) => hit.peaksDbfs[pair.a] ?? []);
  const [drums, kicks] = [peaks('drum'), peaks('kick')];
  return figureOf(Math.min(drums.length, kicks.length), () =>
    minus(uncertainMedian(drums, seed), uncertainMedian(kicks, seed + 1)),
  );
}

/** Of all kick hits: hits struck alike would be even by choice. */
function evenness({ facts, pair }: TakeSide, { seed }: ReadOptions): MeasuredTake {
  const kicks = facts.hits.filter((hit) => hit.kind === 'kick');
  const peaks = kicks.flatMap((hit) => hit.peaksDbfs[pair.a] ?? []);
  return figureOf(peaks.length, () => uncertainIqr(peaks, seed));
}

function attack(side: TakeSide, { alike, seed }: ReadOptions): MeasuredTake {
  if (!side.hitsKept) return nothing(side);
  const values = alike.flatMap((hit) => hit.figures.attackDb ?? []);
  const told = figureOf(values.length, () => uncertainMedian(values, seed));
  const enoughAtAll = side.kicks.filter((hit) => hit.figures.attackDb !== null).length >= FEWEST_HITS;
  return told.reason && enoughAtAll ? { ...told, reason: 'strength-unmatched' } : told;
}

function isFlipped(side: TakeSide, choiceRule: ChoiceRule): boolean {
  return choiceRule === 'best-polarity' ? lowEndSign(side) < 0 : choiceRule === 'flipped';
}

function kickFigure(
  side: TakeSide,
  hits: readonly KickHitTold[],
  { flipped, figure }: { readonly flipped: boolean; readonly figure: () => Uncertain },
): MeasuredTake {
  return side.hitsKept ? { ...figureOf(hits.length, figure), flipped } : { ...nothing(side), flipped };
}

function nothing({ hitsKept, kicks }: TakeSide): MeasuredTake {
  const reason = !hitsKept ? 'not-measured' : kicks.length === 0 ? 'too-few-hits' : 'cannot-tell';
  return { figure: null, hits: kicks.length, reason, flipped: false };
}

/** Below six hits a figure is shown, but nothing sure can be said of it. */
function figureOf(hits: number, figure: () => Uncertain): MeasuredTake {
  return {
    figure: hits === 0 ? null : figure(),
    hits,
    reason: hits < FEWEST_HITS ? 'too-few-hits' : null,
    flipped: false,
  };
}
