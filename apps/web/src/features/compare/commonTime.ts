import type { ReportResponse } from '@thudline/contracts';

type Timed = Pick<ReportResponse, 'hits' | 'durationS'>;

/** One time for two takes: 0 is the first kick hit of each. */
export interface CommonTime {
  /** Where that is in each take, in seconds of its own. */
  zerosS: readonly number[];
  startS: number;
  endS: number;
}

/** Room before the first hit, so that its attack is heard. */
const beforeHitS = 0.06;

/** As much of long takes is held in memory at a time, so that switching is exact. */
export const stretchS = 180;

/** Aligns takes on their first kick hit; on their first hit where there is no kick, on their beginning where there is none. */
export function commonTime(reports: readonly Timed[]): CommonTime {
  const zerosS = reports.map(
    ({ hits }) => (hits.find((hit) => hit.kind === 'kick') ?? hits.at(0))?.timeS ?? 0,
  );
  const ends = reports.map(({ durationS }, i) => durationS - zerosS[i]);
  return { zerosS, startS: -beforeHitS, endS: Math.max(1, ...ends) };
}

/** Where to begin so that a hit is heard from its attack on. */
export const justBefore = (hitS: number): number => hitS - beforeHitS;

/**
 * What is loaded to play from a moment on.
 *
 * @param fromS - on the common time
 * @returns the stretch on the common time, the same in each take's own, and where each sound has the common time's 0
 */
export function heardStretch({ zerosS, startS, endS }: CommonTime, fromS: number) {
  // Takes that are no longer than one stretch are loaded once, wherever playing begins.
  const begin = endS - startS <= stretchS ? startS : fromS;
  const end = Math.min(endS, begin + stretchS);
  const stretches = zerosS.map((zeroS) => ({
    startS: Math.max(0, zeroS + begin),
    endS: Math.max(0, zeroS + end),
  }));
  return {
    startS: begin,
    endS: end,
    stretches,
    zerosS: zerosS.map((zeroS, i) => zeroS - stretches[i].startS),
    ...(end < endS ? { goesOnAtS: end } : {}),
  };
}
