import type { ArrivalFacts } from '../../facts';
import { interquartileRange } from '../statistics';
import type { PhasePeak, PhaseTransform } from './phaseTransform';

export interface ArrivalEvidence {
  readonly hits: number;
  readonly overheadSounds: boolean;
  readonly first: {
    readonly medianMs: number | null;
    readonly iqrMs: number | null;
    readonly hits: number;
    /** How far what the overhead hears first is the same at every hit, −1 … 1; null below two hits. */
    readonly repeats: number | null;
  };
  readonly phase: Pick<PhaseTransform, 'peaks' | 'lagsPerHit'>;
}

type ChosenArrival = Omit<ArrivalFacts, 'arrivalSamples' | 'firstSwing'>;

/** Lags that are looked at; a pair further apart doesn't start together. */
const RANGE = { fromMs: -20, toMs: 30 };
/** Seen: 0.2–0.3 on real kits, where the highest peak jumps; 0.51 and more where one sound really reaches both. */
const STRONG = 0.45;
/** Peaks nearly as high as the highest are its rivals: the first arrivals choose among them. */
const RIVAL_SHARE = 0.85;
/** More spread than this and it is no arrival of one source (docs/measurements.md, 5). */
const LARGEST_IQR_MS = 1;
/**
 * A hat struck with the kick reaches the overhead first, by as much as it is nearer: at most some 4 m. Nothing makes the
 * first arrival much later than the sound itself.
 */
const EARLIER_MS = 12;
const LATER_MS = 3;
const AGREE_MS = 0.3;
/** A weak peak means something from here on: chance reaches 0.3 within 50 ms. */
const NOTED = 0.35;
/** Below this a peak that the first arrivals contradict may be an echo, or the hat's bleed into the kick microphone. */
const HIGH = 0.6;
/** The kick can't reach the overhead before its own microphone; something struck with it can. */
const AHEAD_MS = -0.5;
/** Seen: 0.69 and more on real kits, 0.41 and less where a hat comes before the kick. */
const LEAST_REPEATS = 0.5;
/**
 * Factors of the confidence, our choice: what is halved or cut stays below 0.5, "not confident". One way alone stays below
 * 0.7, from where an arrival is within 0.3 ms (arrival.spec, `npm run check:arrival`), and a doubted one below 0.5.
 */
const FULL_HITS = 6;
const ALONE_FACTOR = 0.65;
const DOUBTED_FACTOR = 0.45;
const UNKNOWN_SPREAD_FACTOR = 0.5;

/**
 * Combines the two ways of placing the overhead: a strong peak of the phase transform is exact, a weak one means nothing,
 * and then the first arrivals are what holds.
 */
export function chooseArrival(evidence: ArrivalEvidence): ChosenArrival {
  const { hits, overheadSounds, first, phase } = evidence;
  if (hits === 0) return cannotTell('no-kick-hits', evidence);
  if (!overheadSounds) return cannotTell('overhead-silent', evidence);
  const peaks = phase.peaks(RANGE);
  const strong = strongPeak(peaks, first.medianMs);
  if (strong && hits > 1) return byPhase(strong, evidence);
  if (first.medianMs === null) return cannotTell('too-few-hits', evidence);
  if (first.iqrMs !== null && first.iqrMs > LARGEST_IQR_MS) return cannotTell('hits-disagree', evidence);
  const highest = peaks.at(0);
  const agrees =
    highest !== undefined && Math.abs(highest.height) >= NOTED && isNear(highest, first.medianMs);
  const alone = isNew(first.repeats) ? DOUBTED_FACTOR : ALONE_FACTOR;
  return {
    arrivalMs: first.medianMs,
    arrivalIqrMs: first.iqrMs,
    hitsUsed: first.hits,
    confidence: enough(first.hits) * steadiness(first.iqrMs) * (agrees ? 1 : alone),
    reason: null,
  };
}

function isNear(peak: PhasePeak, ms: number): boolean {
  return Math.abs(peak.lagMs - ms) <= AGREE_MS;
}

/** A hat's beginning, or a crash's: noise that is new at every hit. */
function isNew(repeats: number | null): boolean {
  return repeats !== null && repeats < LEAST_REPEATS;
}

function strongPeak(peaks: readonly PhasePeak[], nearMs: number | null): PhasePeak | null {
  const highest = peaks.at(0);
  if (!highest || Math.abs(highest.height) < STRONG) return null;
  if (nearMs === null) return highest;
  const distance = (peak: PhasePeak): number => Math.abs(peak.lagMs - nearMs);
  return peaks
    .filter((peak) => Math.abs(peak.height) >= RIVAL_SHARE * Math.abs(highest.height))
    .reduce((nearest, peak) => (distance(peak) < distance(nearest) ? peak : nearest));
}

function byPhase(peak: PhasePeak, evidence: ArrivalEvidence): ChosenArrival {
  const { first, hits, phase } = evidence;
  const lags = phase.lagsPerHit(peak.lagMs);
  const iqrMs = interquartileRange(lags);
  const laterMs = first.medianMs === null ? 0 : first.medianMs - peak.lagMs;
  const firstIsSure = first.iqrMs !== null && first.iqrMs <= LARGEST_IQR_MS;
  if (iqrMs !== null && iqrMs > LARGEST_IQR_MS) return cannotTell('hits-disagree', evidence);
  if (firstIsSure && (laterMs > LATER_MS || laterMs < -EARLIER_MS))
    return cannotTell('methods-disagree', evidence);
  return {
    arrivalMs: peak.lagMs,
    arrivalIqrMs: iqrMs,
    hitsUsed: hits,
    confidence: enough(hits) * steadiness(iqrMs) * phaseFactor(peak, evidence),
    reason: null,
  };
}

/** Both ways must point to one place, and the first arrivals to the highest peak, not to a side lobe of it. */
function phaseFactor(peak: PhasePeak, { first, phase }: ArrivalEvidence): number {
  const highest = phase.peaks(RANGE).at(0);
  if (first.medianMs === null || isNear(peak, first.medianMs))
    return highest && isNear(highest, peak.lagMs) ? 1 : ALONE_FACTOR;
  const isDoubted = Math.abs(peak.height) < HIGH || peak.lagMs < AHEAD_MS;
  return isDoubted ? DOUBTED_FACTOR : ALONE_FACTOR;
}

function cannotTell(reason: NonNullable<ArrivalFacts['reason']>, { first }: ArrivalEvidence): ChosenArrival {
  return { arrivalMs: null, arrivalIqrMs: first.iqrMs, hitsUsed: first.hits, confidence: 0, reason };
}

function enough(hits: number): number {
  return Math.min(1, hits / FULL_HITS);
}

function steadiness(iqrMs: number | null): number {
  return iqrMs === null ? UNKNOWN_SPREAD_FACTOR : Math.max(0, 1 - iqrMs / LARGEST_IQR_MS);
}
