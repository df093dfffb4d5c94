import type { TakeListItem, TakeResponse } from '@thudline/contracts';
import { useEffect, useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { isMeasured } from './useNewestTake';

const storageKey = (takeId: string) => `thudline.big-print.${takeId}`;

/**
 * Whoever opens an old take's Big print wants that take: only takes added later lead on. The number is kept for the
 * tab, since a phone that slept may load the page again after the next take came.
 */
function readKnownNumber(take: TakeResponse, newestMeasured: TakeListItem | null): number {
  const stored = Number(sessionStorage.getItem(storageKey(take.id)));
  if (stored > 0) return stored;
  const known = Math.max(take.number, newestMeasured?.number ?? 0);
  sessionStorage.setItem(storageKey(take.id), String(known));
  return known;
}

/** Goes on to the next take's Big print as soon as it is measured. @returns that take while it isn't yet */
export function useNextTake(
  take: TakeResponse,
  { newest, newestMeasured }: { newest: TakeListItem | null; newestMeasured: TakeListItem | null },
): TakeListItem | null {
  const navigate = useNavigate();
  const [knownNumber] = useState(() => readKnownNumber(take, newestMeasured));
  const next = newest && newest.number > knownNumber ? newest : null;
  const nextId = next && isMeasured(next) ? next.id : null;
  useEffect(() => {
    if (nextId) void navigate(`/takes/${nextId}/big`, { replace: true });
  }, [navigate, nextId]);
  return next;
}
