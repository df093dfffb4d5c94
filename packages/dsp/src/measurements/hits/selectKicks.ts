import { median } from '../statistics';
import type { KickCandidate, KickCandidates } from './kickCandidates';

/** The rules of docs/measurements.md, 3, tried on 2,231 real channels of two kits and on grooves made of them. */
const OVER_FLOOR_DB = 15;
const BELOW_REFERENCE_DB = 18;
/** Further below the reference than this, a hit must also be a kick by its balance between the microphones. */
const SOFT_BELOW_REFERENCE_DB = 6;
const BALANCE_WITHIN_DB = 4;
const APART_MS = 50;
const REFERENCE_SHARE = 0.25;
/**
 * Two modes of one shell beat, and the level rises again some 60 ms after the hit. On
 * muldjord-rock-100bpm this takes 15 hits found down to the 8 there are; it costs none of the sixteenths tried.
 */
const RINGING_WITHIN_MS = 100;
const RINGING_BELOW_DB = 6;

/**
 * Chooses the kick hits among the candidates.
 *
 * Loudness is judged against the median of the loudest quarter, not against the maximum: a knocked stand would set that.
 * Softer ones must also keep the loud hits' balance between the microphones: the bleed of a low tom doesn't.
 *
 * @returns in order of time, at least 50 ms apart (the louder of two closer ones stays)
 */
export function selectKicks(found: KickCandidates, sampleRateHz: number): KickCandidate[] {
  const audible = withoutKnocks(
    found.candidates.filter((candidate) => candidate.kickDb >= found.floorDb + OVER_FLOOR_DB),
    found.overheadFloorDb,
  );
  const referenceDb = reference(audible);
  if (referenceDb === null) return [];
  const loud = audible.filter((candidate) => candidate.kickDb >= referenceDb - SOFT_BELOW_REFERENCE_DB);
  const loudBalanceDb = median(loud.map(balanceDb)) ?? 0;
  const kept = audible.filter((candidate) => {
    if (candidate.kickDb < referenceDb - BELOW_REFERENCE_DB) return false;
    if (candidate.kickDb >= referenceDb - SOFT_BELOW_REFERENCE_DB) return true;
    return Math.abs(balanceDb(candidate) - loudBalanceDb) <= BALANCE_WITHIN_DB;
  });
  const samplesPerMs = sampleRateHz / 1000;
  return apart(kept, APART_MS * samplesPerMs).filter((candidate, index, all) => {
    const before = all[index - 1];
    if (!before || candidate.atSample - before.atSample >= RINGING_WITHIN_MS * samplesPerMs) return true;
    return candidate.kickDb >= before.kickDb - RINGING_BELOW_DB;
  });
}

/**
 * A knock on the kick microphone's stand is far louder there than the kicks and isn't heard in the overhead at all. Where the
 * overhead hears no kick either, it can't tell them apart. Our choice: with few hits, two knocks would set the reference.
 */
const HEARD_OVER_FLOOR_DB = 6;

function withoutKnocks(audible: readonly KickCandidate[], overheadFloorDb: number): KickCandidate[] {
  const isHeard = (overheadDb: number): boolean => overheadDb >= overheadFloorDb + HEARD_OVER_FLOOR_DB;
  const usual = {
    kickDb: median(audible.map(({ kickDb }) => kickDb)) ?? 0,
    overheadDb: median(audible.map(({ overheadDb }) => overheadDb)) ?? 0,
  };
  if (!isHeard(usual.overheadDb)) return [...audible];
  const isKnock = ({ kickDb, overheadDb }: KickCandidate): boolean =>
    kickDb > usual.kickDb + BELOW_REFERENCE_DB && !isHeard(overheadDb);
  return audible.filter((candidate) => !isKnock(candidate));
}

function balanceDb(candidate: KickCandidate): number {
  return candidate.kickDb - candidate.overheadDb;
}

/**
 * What few kicks among many rises are judged by: three or more that stand so far above the loudest quarter that its median
 * would be no hit beside them, and that the kick microphone hears better than the rest. One snare in a room can make three
 * rises of bleed, so three kicks among seven snares were left out, and the snares told as kicks.
 */
const FEWEST_ABOVE = 3;

function reference(audible: readonly KickCandidate[]): number | null {
  const loudest = loudestQuarter(audible);
  const ofQuarterDb = median(loudest.map(({ kickDb }) => kickDb));
  if (ofQuarterDb === null) return null;
  const far = loudest.filter(({ kickDb }) => kickDb > ofQuarterDb + BELOW_REFERENCE_DB);
  const rest = loudest.filter(({ kickDb }) => kickDb <= ofQuarterDb + BELOW_REFERENCE_DB);
  const byBalance = (median(far.map(balanceDb)) ?? 0) - (median(rest.map(balanceDb)) ?? 0);
  const areKicks = far.length >= FEWEST_ABOVE && byBalance > BALANCE_WITHIN_DB;
  return areKicks ? median(far.map(({ kickDb }) => kickDb)) : ofQuarterDb;
}

function loudestQuarter(candidates: readonly KickCandidate[]): KickCandidate[] {
  const sorted = [...candidates].sort((a, b) => b.kickDb - a.kickDb);
  return sorted.slice(0, Math.ceil(sorted.length * REFERENCE_SHARE));
}

function apart(candidates: readonly KickCandidate[], samples: number): KickCandidate[] {
  const kept: KickCandidate[] = [];
  for (const candidate of candidates) {
    const last = kept.at(-1);
    if (!last || candidate.atSample - last.atSample >= samples) kept.push(candidate);
    else if (candidate.kickDb > last.kickDb) kept[kept.length - 1] = candidate;
  }
  return kept;
}
