import { dbAmplitude } from '../../decibel';
import type { RoomBandFacts } from '../../facts';
import type { ChangeWord, ComparedKey, HitFigure, PerHitRule } from './comparedFigure';
import { lowEndDb } from './lowEndOfHits';
import { worthSteps } from './takeChange';
import type { KickHitTold, TakeSide } from './takeSide';
import { minus, uncertain, uncertainIqr, uncertainMedian } from './uncertain';

/** The early-to-late energy is told for one octave; our choice: the middle one. */
const EARLY_TO_LATE_HZ = 1000;

type Words = PerHitRule['words'];
type DecayKey = Exclude<keyof NonNullable<RoomBandFacts['perHit']>, 'earlyS'>;

/** Figures that every hit says something about. */
export const perHitRules: readonly PerHitRule[] = [
  {
    key: 'low-end',
    unit: 'dB',
    step: worthSteps.lowEndDb,
    words: { more: 'fuller', less: 'thinner' },
    strength: 'match-if-possible',
    read: (side, kicks) => (side.hitsKept ? lowEnd(side, kicks) : null),
  },
  levelRule('cymbals-over-drums', { more: 'higher', less: 'lower' }, cymbalsOverDrums),
  levelRule('evenness', { more: 'less even', less: 'more even' }, evenness),
  kickRule('attack', { more: 'brighter', less: 'duller' }, ({ attackDb }) => attackDb),
  kickRule('overhead-63', fuller(), ({ overheadThirdOctavesDbfs }) => overheadThirdOctavesDbfs.hz63),
  kickRule('overhead-125', fuller(), ({ overheadThirdOctavesDbfs }) => overheadThirdOctavesDbfs.hz125),
  decayRule('decay-500', 500),
  decayRule('decay-1000', 1000),
  decayRule('decay-2000', 2000),
  decayRule('decay-4000', 4000),
  {
    ...levelRule('early-to-late', { more: 'higher', less: 'lower' }, (side) =>
      roomFigure(side, EARLY_TO_LATE_HZ, 'earlyToLateDb'),
    ),
    step: worthSteps.earlyToLateDb,
  },
  levelRule('brightness', { more: 'brighter', less: 'duller' }, ({ facts }) =>
    medianOf(facts.room?.brightnessPerHitDb),
  ),
];

function levelRule(key: ComparedKey, words: Words, read: PerHitRule['read']): PerHitRule {
  return { key, unit: 'dB', step: worthSteps.levelDb, words, strength: 'any', read };
}

/** A figure of each kick hit, told only of hits struck alike. */
function kickRule(
  key: ComparedKey,
  words: Words,
  figure: (figures: KickHitTold['figures']) => number | null,
): PerHitRule {
  return {
    ...levelRule(key, words, ({ hitsKept }, kicks) =>
      hitsKept ? medianOf(kicks.flatMap((hit) => figure(hit.figures) ?? [])) : null,
    ),
    unit: key === 'attack' ? 'dB' : 'dBFS',
    strength: 'must-match',
  };
}

function decayRule(key: ComparedKey, centreHz: number): PerHitRule {
  return {
    key,
    unit: 's',
    step: worthSteps.decayS,
    words: { more: 'longer', less: 'shorter' },
    strength: 'any',
    read: (side) => roomFigure(side, centreHz, 't20S'),
  };
}

function fuller(): { more: ChangeWord; less: ChangeWord } {
  return { more: 'fuller', less: 'thinner' };
}

/** The two added as recorded, levels matched, against the power sum: the sheet's low end. */
function lowEnd({ pair }: TakeSide, kicks: readonly KickHitTold[]): HitFigure {
  const { matchGainDb } = pair.agreement;
  const gain = matchGainDb === null ? null : dbAmplitude(matchGainDb);
  return {
    hits: kicks.length,
    figure: (seed) =>
      gain === null
        ? null
        : uncertain(kicks, { figure: (hits) => lowEndDb(hits, { gain, against: 'power-sum' }), seed }),
  };
}

function cymbalsOverDrums({ facts: { balance } }: TakeSide): HitFigure | null {
  if (!balance?.perHit) return null;
  const { drumsLufs, cymbalsLufs } = balance.perHit;
  return {
    hits: Math.min(drumsLufs.length, cymbalsLufs.length),
    figure: (seed) => minus(uncertainMedian(cymbalsLufs, seed), uncertainMedian(drumsLufs, seed + 100)),
  };
}

/** Of all kick hits: hits struck alike would be even by choice. */
function evenness({ facts, pair }: TakeSide): HitFigure {
  const kicks = facts.hits.filter((hit) => hit.kind === 'kick');
  const peaks = kicks.flatMap((hit) => hit.peaksDbfs[pair.a] ?? []);
  return { hits: peaks.length, figure: (seed) => uncertainIqr(peaks, seed) };
}

function roomFigure({ facts }: TakeSide, centreHz: number, of: DecayKey): HitFigure | null {
  return medianOf(facts.room?.bands.find((band) => band.centreHz === centreHz)?.perHit?.[of]);
}

function medianOf(values: readonly number[] | undefined): HitFigure | null {
  return values ? { hits: values.length, figure: (seed) => uncertainMedian(values, seed) } : null;
}
