import type { ReportResponse } from '@thudline/contracts';
import { heardS } from './takeSound';

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

/** Aligns takes on their first kick hit; on their first hit where there is no kick, on their beginning where there is none. */
export function commonTime(reports: readonly Timed[]): CommonTime {
  const zerosS = reports.map(
    ({ hits }) => (hits.find((hit) => hit.kind === 'kick') ?? hits.at(0))?.timeS ?? 0,
  );
  const ends = reports.map(({ durationS }, i) => Math.min(durationS, heardS) - zerosS[i]);
  return { zerosS, startS: -beforeHitS, endS: Math.max(1, ...ends) };
}

/** Where to begin so that a hit is heard from its attack on. */
export const justBefore = (hitS: number): number => hitS - beforeHitS;
