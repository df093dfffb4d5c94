import type { TakeFacts } from '../../facts';
import { median } from '../statistics';
import type { Interval } from './interval';
import { WITHIN_DB } from './strengthMatch';
import { takeSide, type TakeSide } from './takeSide';
import {
  tryOutMeasures,
  type ChoiceRule,
  type MeasuredTake,
  type TryOutMeasure,
  type TryOutReason,
} from './tryOutMeasures';
import { interval95, minus, scaled, sum, type Uncertain } from './uncertain';

export interface RankTryOutOptions {
  readonly measure: TryOutMeasure;
  /** How the overhead is played in low end and agreement; the others don't depend on it. */
  readonly choiceRule: ChoiceRule;
  /** A second measure, and its share (0–1) beside the first. */
  readonly and?: { readonly measure: TryOutMeasure; readonly share: number };
}

/** `best`, `as-good` as it as far as can be told, or clearly `worse`. */
export type Standing = 'best' | 'as-good' | 'worse';

export interface RankedTake {
  /** In the ranking's unit; null where a reason stands instead. */
  readonly value: number | null;
  readonly interval95: Interval | null;
  /** 1 for the best; null where it can't be ranked. */
  readonly rank: number | null;
  /** Value minus the best's, and where that lies with 95 %. */
  readonly fromBest: number | null;
  readonly fromBestInterval95: Interval | null;
  readonly standing: Standing | null;
  /** "fullest", "no clear difference", "clearly thinner". */
  readonly word: string | null;
  readonly reason: TryOutReason | null;
  /** Hits it was told from. */
  readonly hits: number;
  /** Whether low end and agreement are told with the overhead flipped. */
  readonly flipped: boolean;
}

export interface TryOutRanking {
  readonly unit: 'dB' | '' | 'steps';
  /** What is worth mentioning, in that unit. */
  readonly step: number;
  readonly higherIsBetter: boolean;
  /** In the order given. */
  readonly takes: readonly RankedTake[];
  /** Place of the best in `takes`; null where none can be ranked. */
  readonly bestIndex: number | null;
}

const NO_DIFFERENCE = 'no clear difference';

/**
 * Ranks takes that differ in one thing on purpose by what a measure says of their hits.
 *
 * A take is worse than the best only where the seeded bootstrap 95 % interval of their difference excludes zero and the
 * difference exceeds the step worth mentioning; that two intervals overlap says nothing. Low end and attack are told from
 * hits within 3 dB of the middle of all takes; low end from all hits where these are too few. Two measures are added in
 * steps worth mentioning, weighted, the higher the better.
 *
 * @param takes - at least one
 * @throws {SignalError} `option` for a take without a kick microphone and an overhead
 * @example
 * const ranking = rankTryOut([{ facts }, { facts }], { measure: 'low-end', choiceRule: 'best-polarity' });
 * ranking.takes[1].word // 'no clear difference'
 */
export function rankTryOut(
  takes: readonly { readonly facts: TakeFacts }[],
  { measure, choiceRule, and }: RankTryOutOptions,
): TryOutRanking {
  const sides = takes.map((take) => takeSide(take.facts));
  const first = measured(sides, { measure, choiceRule });
  const rule = tryOutMeasures[measure];
  if (!and) return ranking(first, { ...rule, reversed: !rule.higherIsBetter });
  const second = measured(sides, { measure: and.measure, choiceRule });
  const both = first.map((take, i) =>
    weighted(inSteps(take, measure, 1 - and.share), inSteps(second[i], and.measure, and.share)),
  );
  return ranking(both, {
    unit: 'steps',
    step: 1,
    reversed: false,
    words: { best: 'best', worse: 'clearly behind' },
  });
}

function measured(
  sides: readonly TakeSide[],
  { measure, choiceRule }: { readonly measure: TryOutMeasure; readonly choiceRule: ChoiceRule },
): MeasuredTake[] {
  const middles = sides.flatMap((side) => median(side.kicks.map((hit) => hit.peakDbfs)) ?? []);
  const middleDbfs = median(middles) ?? 0;
  return sides.map((side, index) => {
    const alike = side.kicks.filter((hit) => Math.abs(hit.peakDbfs - middleDbfs) <= WITHIN_DB);
    // Takes drawn with one seed would be drawn alike where they hold as many hits.
    return tryOutMeasures[measure].read(side, { alike, choiceRule, seed: 1000 * (index + 1) });
  });
}

/** A take's figure in steps worth mentioning, the higher the better. */
function inSteps(take: MeasuredTake, measure: TryOutMeasure, share: number): MeasuredTake {
  const { step, higherIsBetter } = tryOutMeasures[measure];
  const factor = ((higherIsBetter ? 1 : -1) * share) / step;
  return { ...take, figure: take.figure && scaled(take.figure, factor) };
}

function weighted(a: MeasuredTake, b: MeasuredTake): MeasuredTake {
  return {
    figure: a.figure && b.figure && sum(a.figure, b.figure),
    hits: Math.min(a.hits, b.hits),
    reason: a.reason ?? b.reason,
    flipped: a.flipped || b.flipped,
  };
}

interface RankingRule {
  readonly unit: TryOutRanking['unit'];
  readonly step: number;
  /** The lower the better. */
  readonly reversed: boolean;
  readonly words: { readonly best: string; readonly worse: string };
}

function ranking(takes: readonly MeasuredTake[], rule: RankingRule): TryOutRanking {
  const sign = rule.reversed ? -1 : 1;
  const order = takes
    .flatMap(({ figure, reason }, index) => (figure && !reason ? [{ index, figure }] : []))
    .sort((a, b) => sign * (b.figure.value - a.figure.value));
  const best = order[0] ?? null;
  const rankOf = new Map(order.map(({ index }, place) => [index, place + 1]));
  return {
    unit: rule.unit,
    step: rule.step,
    higherIsBetter: !rule.reversed,
    bestIndex: best?.index ?? null,
    takes: takes.map((take, index) => {
      const { figure, hits, reason, flipped } = take;
      const rank = rankOf.get(index) ?? null;
      const told = {
        value: figure?.value ?? null,
        interval95: figure && !reason ? interval95(figure) : null,
      };
      const beside =
        rank === null || !best || !figure ? unranked : besideBest(figure, best.figure, { rule, rank });
      return { ...told, rank, ...beside, reason, hits, flipped };
    }),
  };
}

type Beside = Pick<RankedTake, 'fromBest' | 'fromBestInterval95' | 'standing' | 'word'>;
const unranked: Beside = { fromBest: null, fromBestInterval95: null, standing: null, word: null };

function besideBest(
  figure: Uncertain,
  best: Uncertain,
  { rule, rank }: { readonly rule: RankingRule; readonly rank: number },
): Beside {
  if (rank === 1) {
    return { fromBest: 0, fromBestInterval95: { low: 0, high: 0 }, standing: 'best', word: rule.words.best };
  }
  const difference = minus(figure, best);
  const interval = interval95(difference);
  const worse = (interval.low > 0 || interval.high < 0) && Math.abs(difference.value) > rule.step;
  return {
    fromBest: difference.value,
    fromBestInterval95: interval,
    standing: worse ? 'worse' : 'as-good',
    word: worse ? rule.words.worse : NO_DIFFERENCE,
  };
}
