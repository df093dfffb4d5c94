import type { TryOutResponse } from '@thudline/contracts';
import { isMeasuring } from '../takes/rowWords';

export interface MeasuringProgress {
  /** Takes that are there. */
  total: number;
  /** Measured, or given up. */
  done: number;
  waiting: number;
  failed: number;
  /** 0–1 over all of them. */
  share: number;
}

/** All measurements of a try-out as one. */
export function measuringProgress({ places }: Pick<TryOutResponse, 'places'>): MeasuringProgress {
  const states = places.flatMap(({ take }) => take?.measurement ?? []);
  const waiting = states.filter(isMeasuring);
  const total = states.length;
  const doneShare = total - waiting.length + waiting.reduce((sum, { progress }) => sum + progress, 0);
  return {
    total,
    done: total - waiting.length,
    waiting: waiting.length,
    failed: states.filter(({ state }) => state === 'failed').length,
    share: total === 0 ? 0 : doneShare / total,
  };
}
