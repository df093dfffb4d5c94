import type { HitFacts } from '../../facts';
import { median } from '../statistics';

/** A loud drum hit with nothing just before it and room after it, seconds in the file. */
export interface LoudHit {
  readonly timeS: number;
  /** When the next hit begins; infinite after the last. */
  readonly nextS: number;
}

/** Softer hits than this under the loud ones sink into the noise too soon; our choice. */
const LOUD_WITHIN_DB = 6;
const LOUD_SHARE = 0.25;
/** As for drums and cymbals (docs/measurements.md, 6). */
const ALONE_BEFORE_S = 0.15;
/** 35 dB take 0.2 s even in a dry room of 0.35 s per 60 dB. */
const QUIET_AFTER_S = 0.2;
/** Enough for a steady median, and no more to read however long the take; our choice. */
const MOST_HITS = 24;

/** The loud drum hits that leave time to hear the room, in order of time. */
export function loudDrumHits(hits: readonly HitFacts[], overhead: number): LoudHit[] {
  const drums = hits.flatMap((hit, index) => {
    const peakDbfs = hit.peaksDbfs[overhead];
    return hit.kind === 'drum' && peakDbfs !== null && peakDbfs !== undefined ? [{ index, peakDbfs }] : [];
  });
  const loudestFirst = [...drums].sort((a, b) => b.peakDbfs - a.peakDbfs);
  const loudest = loudestFirst.slice(0, Math.ceil(drums.length * LOUD_SHARE));
  const limitDbfs = (median(loudest.map((drum) => drum.peakDbfs)) ?? 0) - LOUD_WITHIN_DB;
  return loudestFirst
    .filter(({ index, peakDbfs }) => peakDbfs >= limitDbfs && isAlone(hits, index))
    .slice(0, MOST_HITS)
    .sort((a, b) => a.index - b.index)
    .map(({ index }) => ({ timeS: hits[index].timeS, nextS: hits[index + 1]?.timeS ?? Infinity }));
}

function isAlone(hits: readonly HitFacts[], index: number): boolean {
  const { timeS } = hits[index];
  const before = hits[index - 1];
  const after = hits[index + 1];
  return (
    (!before || timeS - before.timeS >= ALONE_BEFORE_S) && (!after || after.timeS - timeS >= QUIET_AFTER_S)
  );
}
