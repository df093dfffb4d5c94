import { powerDb } from '../../decibel';
import type { BalanceFacts, BalanceReason, HitFacts } from '../../facts';
import type { TrackSource } from '../../trackSource';
import { evenly } from '../evenly';
import { createBandEnergy } from '../filters/bandEnergy';
import { kWeighting } from '../loudness/kWeighting';
import { rounded } from '../rounded';
import { median } from '../statistics';

/** docs/measurements.md, 6: the level is taken over this, and only of hits with nothing for so long before. */
const LEVEL_MS = 400;
const ALONE_BEFORE_MS = 150;
/** Our choice: what comes sooner after a hit leaves too little of it to judge by. */
const ALONE_AFTER_MS = 150;
/** docs/measurements.md, 6. */
const FEWEST_HITS = 5;
/** Enough for a steady median; our choice. */
const MOST_HITS = 100;
/** A hit in the overhead is told up to so much after it begins: a hop is 2 ms and the level averaged over 10. */
const TOLD_LATE_MS = 12;
/** The slower filter's memory is 4 ms long, so an offset of the file is forgotten by then. */
const SETTLE_MS = 100;
/** ITU-R BS.1770-5 eq. (2): takes back what the K-weighting adds at 997 Hz. */
const LUFS_OFFSET_DB = -0.691;

/** A hit with what is around it, seconds in the file. */
interface AloneHit {
  readonly kind: 'drum' | 'cymbal';
  readonly fromS: number;
  readonly toS: number;
}

/**
 * How loud cymbals are against drums in the overhead.
 *
 * Median K-weighted level over 400 ms of the hits that are surely one or the other and stand alone. Where the next hit
 * comes sooner, the energy until then counts for the 400 ms: a drum has nearly all of it in its first 150.
 *
 * @param overhead - read around each hit, at most 100 of each kind, spread over the take
 * @param hits - all hits of the take in order of time
 * @returns LUFS (full-scale sine at 997 Hz: −3.01); null with a reason below five hits of a kind
 * @see ITU-R BS.1770-5 Annex 1 for the weighting; the rule is in docs/measurements.md, 6
 */
export async function balance(overhead: TrackSource, hits: readonly HitFacts[]): Promise<BalanceFacts> {
  const alone = aloneHits(hits);
  const levels = async (kind: AloneHit['kind']): Promise<number[]> => {
    const found: number[] = [];
    const ofKind = alone.filter((hit) => hit.kind === kind);
    for (const hit of evenly(ofKind, MOST_HITS)) {
      const level = await levelLufs(overhead, hit);
      if (level !== null) found.push(level);
    }
    return found;
  };
  const drums = await levels('drum');
  const cymbals = await levels('cymbal');
  const drumsLufs = drums.length < FEWEST_HITS ? null : median(drums);
  const cymbalsLufs = cymbals.length < FEWEST_HITS ? null : median(cymbals);
  return {
    drumsLufs,
    cymbalsLufs,
    differenceDb: drumsLufs === null || cymbalsLufs === null ? null : cymbalsLufs - drumsLufs,
    drumHits: drums.length,
    cymbalHits: cymbals.length,
    reason: reasonFor(drumsLufs, cymbalsLufs),
    perHit: { drumsLufs: drums.map(rounded), cymbalsLufs: cymbals.map(rounded) },
  };
}

function reasonFor(drumsLufs: number | null, cymbalsLufs: number | null): BalanceReason | null {
  if (drumsLufs === null) return cymbalsLufs === null ? 'too-few-of-both' : 'too-few-drums';
  return cymbalsLufs === null ? 'too-few-cymbals' : null;
}

function aloneHits(hits: readonly HitFacts[]): AloneHit[] {
  return hits.flatMap(({ kind, timeS }, index) => {
    if (kind !== 'drum' && kind !== 'cymbal') return [];
    const beforeS = index > 0 ? timeS - hits[index - 1].timeS : Infinity;
    const afterS = index + 1 < hits.length ? hits[index + 1].timeS - timeS : Infinity;
    if (1000 * beforeS < ALONE_BEFORE_MS || 1000 * afterS < ALONE_AFTER_MS) return [];
    const lengthS = Math.min(LEVEL_MS / 1000, afterS);
    const fromS = timeS - TOLD_LATE_MS / 1000;
    return [{ kind, fromS, toS: fromS + lengthS }];
  });
}

async function levelLufs(overhead: TrackSource, { fromS, toS }: AloneHit): Promise<number | null> {
  const { sampleRateHz } = overhead;
  const from = Math.round(fromS * sampleRateHz);
  const settle = Math.round((SETTLE_MS / 1000) * sampleRateHz);
  const samples = await overhead.read(from - settle, Math.round(toS * sampleRateHz));
  const weighted = createBandEnergy(kWeighting(sampleRateHz));
  weighted.next(samples, 0, settle);
  const energy = weighted.next(samples, settle, samples.length);
  const level = powerDb(energy / ((LEVEL_MS / 1000) * sampleRateHz));
  return level === null ? null : level + LUFS_OFFSET_DB;
}
