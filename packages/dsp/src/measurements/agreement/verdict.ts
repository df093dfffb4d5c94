import type { Verdict, VerdictReason } from '../../facts';

export interface VerdictEvidence {
  readonly hits: number;
  /** Hits whose own low end has the sign of the sum over hits. */
  readonly agreeingHits: number;
  /** How far all hits tell of the same way between the microphones, 0–1; null where nothing shows it. */
  readonly hitsAlike: number | null;
  readonly arrivalIqrMs: number | null;
  /** False where hits are there but none could be seen arriving at the overhead. */
  readonly arrives: boolean;
  /** 30–150 Hz, levels matched; null where the overhead is silent. */
  readonly flipGainDb: number | null;
  /** The same for 30–120, 30–150 and 30–200 Hz. */
  readonly bandGainsDb: readonly number[];
}

export interface VerdictResult {
  readonly verdict: Verdict;
  readonly sure: boolean;
  /** Only where it cannot be told. */
  readonly reason: VerdictReason | null;
}

/** Signs that agree by chance: 6 of 8 in 29 % of all draws, so this alone lets files of different passes through. */
const AGREEING_SHARE = 0.75;
/**
 * Hits must be alike by this over √hits: files of different passes reach 0.89/√hits on average, and 95 % of them stay
 * below 1.5/√hits however many hits there are (decisions/0014). Below three hits nothing is sure anyway.
 */
const LEAST_ALIKE = 1.5;
const ALIKE_FROM_HITS = 3;
const LARGEST_IQR_MS = 1;
const LARGEST_BAND_SPAN_DB = 2;
const EITHER_WAY_BELOW_DB = 0.5;
const SURE_FROM_DB = 1;
const SURE_FROM_HITS = 3;

/** Whether to flip the overhead, to keep its polarity, that it makes no difference, or that it can't be told and why. */
export function verdictOf(evidence: VerdictEvidence): VerdictResult {
  const { hits, flipGainDb, bandGainsDb } = evidence;
  const reason = whyNot(evidence);
  if (reason !== null || flipGainDb === null) return { verdict: 'cannot-tell', sure: false, reason };
  const verdict = byGain(flipGainDb);
  const enoughHits = hits >= SURE_FROM_HITS;
  if (verdict === 'either-way') return { verdict, sure: enoughHits, reason: null };
  const oneSign = bandGainsDb.every((gainDb) => Math.sign(gainDb) === Math.sign(flipGainDb));
  return { verdict, sure: enoughHits && oneSign && Math.abs(flipGainDb) >= SURE_FROM_DB, reason: null };
}

function whyNot(evidence: VerdictEvidence): VerdictReason | null {
  const { hits, agreeingHits, hitsAlike, arrivalIqrMs, arrives, flipGainDb, bandGainsDb } = evidence;
  if (hits === 0) return 'no-kick-hits';
  if (flipGainDb === null) return 'overhead-silent';
  if (agreeingHits < AGREEING_SHARE * hits) return 'hits-disagree';
  if (hits >= ALIKE_FROM_HITS && hitsAlike !== null && hitsAlike < LEAST_ALIKE / Math.sqrt(hits))
    return 'hits-unlike';
  if ((arrivalIqrMs !== null && arrivalIqrMs > LARGEST_IQR_MS) || !arrives) return 'arrival-spread';
  const span = Math.max(...bandGainsDb) - Math.min(...bandGainsDb);
  const verdicts = new Set(bandGainsDb.map(byGain));
  return span > LARGEST_BAND_SPAN_DB && verdicts.size > 1 ? 'bands-disagree' : null;
}

function byGain(flipGainDb: number): Exclude<Verdict, 'cannot-tell'> {
  if (Math.abs(flipGainDb) < EITHER_WAY_BELOW_DB) return 'either-way';
  return flipGainDb > 0 ? 'flip' : 'keep';
}
