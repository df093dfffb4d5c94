import type { TakeFacts } from '../../facts';
import { arrivalFigure } from './arrivalFigure';
import { untold, wordOf, type ComparedFigure, type HitFigure, type PerHitRule } from './comparedFigure';
import { perHitRules } from './perHitRules';
import { strengthMatch } from './strengthMatch';
import { seeds } from './medianDifference';
import { changeOf, FEWEST_HITS } from './takeChange';
import { takeSide, type KickHitTold, type TakeSide } from './takeSide';
import { wholeTakeFigures } from './wholeTakeFigures';

export interface CompareTakesInput {
  readonly before: TakeFacts;
  readonly after: TakeFacts;
  /**
   * True only where both preamps are known to have stood alike: the strength of a hit is told by its level in the file, so
   * otherwise hits can't be matched by strength.
   */
  readonly gainKnownSame: boolean;
  /** Which figures are wanted; every one there is where nothing is said. */
  readonly keys?: readonly ComparedFigure['key'][];
}

/**
 * What changed from one take to another, figure by figure, and how surely.
 *
 * Figures of single hits are told from at least six hits a side, with a seeded bootstrap 95 % interval; those that move
 * with how hard the drum is hit only from hits within 3 dB of both takes' medians. Figures of the whole take are a plain
 * difference without interval, told as clear beyond their step.
 *
 * @returns every figure there is, in the order to show them; what can't be told has a reason
 * @throws {SignalError} `option` for a take without a kick microphone and an overhead
 * @example
 * const figures = compareTakes({ before: facts, after: facts, gainKnownSame: true });
 * figures.filter(({ clear }) => clear) // []
 */
export function compareTakes({ before, after, gainKnownSame, keys }: CompareTakesInput): ComparedFigure[] {
  const sides = { before: takeSide(before), after: takeSide(after) };
  const alike = gainKnownSame ? hitsAlike(sides) : null;
  const wanted = perHitRules.filter(({ key }) => !keys || keys.includes(key));
  const perHit = wanted.map((rule) => hitFigure(rule, sides, alike));
  const figures = [...wholeTakeFigures(sides), arrivalFigure(sides), ...perHit];
  return order
    .filter((key) => !keys || keys.includes(key))
    .flatMap((key) => figures.filter((figure) => figure.key === key));
}

const order: readonly ComparedFigure['key'][] = [
  'low-end',
  'hardest-kick',
  'hardest-overhead',
  'cymbals-over-drums',
  'arrival',
  'noise-kick',
  'noise-overhead',
  'evenness',
  'attack',
  'overhead-63',
  'overhead-125',
  'decay-500',
  'decay-1000',
  'decay-2000',
  'decay-4000',
  'early-to-late',
  'brightness',
];

interface Sides {
  readonly before: TakeSide;
  readonly after: TakeSide;
}
interface Alike {
  readonly before: readonly KickHitTold[];
  readonly after: readonly KickHitTold[];
}

/** @returns null where too few hits of one take are struck as in the other */
function hitsAlike({ before, after }: Sides): Alike | null {
  const peaks = (side: TakeSide): number[] => side.kicks.map((hit) => hit.peakDbfs);
  const places = strengthMatch(peaks(before), peaks(after));
  if (Math.min(places.before.length, places.after.length) < FEWEST_HITS) return null;
  return {
    before: places.before.map((place) => before.kicks[place]),
    after: places.after.map((place) => after.kicks[place]),
  };
}

function hitFigure(rule: PerHitRule, { before, after }: Sides, alike: Alike | null): ComparedFigure {
  const read = {
    before: rule.read(before, alike?.before ?? before.kicks),
    after: rule.read(after, alike?.after ?? after.kicks),
  };
  if (!read.before || !read.after) return untold(rule, 'not-measured');
  const counts = { hitsBefore: read.before.hits, hitsAfter: read.after.hits };
  const enough = Math.min(read.before.hits, read.after.hits) >= FEWEST_HITS;
  if (rule.strength === 'must-match' && !alike) {
    const few = Math.min(before.kicks.length, after.kicks.length) < FEWEST_HITS;
    return { ...untold(rule, few ? 'too-few-hits' : 'strength-unmatched'), ...counts };
  }
  if (!enough) {
    const values = { before: valueOf(read.before), after: valueOf(read.after) };
    return { ...untold(rule, 'too-few-hits'), ...values, ...counts };
  }
  return told(rule, { before: read.before, after: read.after });
}

function valueOf({ hits, figure }: HitFigure): number | null {
  return hits === 0 ? null : (figure(seeds.before)?.value ?? null);
}

function told(rule: PerHitRule, read: { before: HitFigure; after: HitFigure }): ComparedFigure {
  const figures = { before: read.before.figure(seeds.before), after: read.after.figure(seeds.after) };
  if (!figures.before || !figures.after) return untold(rule, 'cannot-tell');
  const { change, interval, clear } = changeOf({ before: figures.before, after: figures.after }, rule.step);
  return {
    key: rule.key,
    unit: rule.unit,
    step: rule.step,
    before: figures.before.value,
    after: figures.after.value,
    change,
    interval95: interval,
    clear,
    reason: null,
    hitsBefore: read.before.hits,
    hitsAfter: read.after.hits,
    word: wordOf(rule, { change, clear }),
  };
}
