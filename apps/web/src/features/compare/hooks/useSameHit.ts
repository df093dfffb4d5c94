import type { ReportResponse } from '@thudline/contracts';
import { useState } from 'react';
import { kickHitsOf, loudestHit } from '../../sheet/kickHits';
import { justBefore, type CommonTime } from '../commonTime';

/** One hit of both takes, told by its place among their kick hits. */
export function useSameHit([before, after]: readonly [ReportResponse, ReportResponse], time: CommonTime) {
  const kicks = [kickHitsOf(before), kickHitsOf(after)];
  const count = Math.min(kicks[0].length, kicks[1].length);
  const [place, setPlace] = useState(() => {
    const loudest = loudestHit(after, kicks[1].slice(0, count));
    return loudest === null ? 0 : kicks[1].indexOf(loudest);
  });
  const hitsAt = kicks.map((indexes) => indexes[place]);
  const hitS = count === 0 ? time.startS : after.hits[hitsAt[1]].timeS - time.zerosS[1];
  return {
    /** How many kick hits both takes have. */
    count,
    places: Array.from({ length: count }, (_, i) => i),
    /** From 0. */
    place,
    choose: setPlace,
    /** Indexes into the hits of either report. */
    hitsAt,
    /** Where to play from, on the common time. */
    startS: count === 0 ? time.startS : justBefore(hitS),
    /** @returns whether there is a hit there */
    step: (by: 1 | -1): boolean => {
      const next = place + by;
      if (next < 0 || next >= count) return false;
      setPlace(next);
      return true;
    },
  };
}

export type SameHitChoice = ReturnType<typeof useSameHit>;
