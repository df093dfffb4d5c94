import type { TrackHops } from './trackPass';
import type { TrackReading } from './trackReading';

/**
 * Goes through the hops of several tracks side by side, to the end of the first that ends; all readings are closed then.
 *
 * @returns as many hops of every track; only good until the next are asked for
 */
export async function* hopLockstep(readings: readonly TrackReading[]): AsyncGenerator<TrackHops[]> {
  const waiting: TrackHops[] = readings.map(() => noHops);
  const refilled = async (track: number): Promise<boolean> => {
    while (waiting[track].low.length === 0) {
      const hops = await readings[track].next();
      if (!hops) return false;
      waiting[track] = hops;
    }
    return true;
  };
  try {
    for (;;) {
      const filled = await Promise.all(readings.map((_unused, track) => refilled(track)));
      if (filled.includes(false)) return;
      const count = Math.min(...waiting.map((hops) => hops.low.length));
      yield waiting.map((hops) => cut(hops, 0, count));
      waiting.forEach((hops, track) => {
        waiting[track] = cut(hops, count);
      });
    }
  } finally {
    await Promise.all(readings.map((reading) => reading.close()));
  }
}

const nothing = new Float64Array(0);
const noHops: TrackHops = { low: nothing, peaks: nothing, body: nothing, bright: nothing };

function cut({ low, peaks, body, bright }: TrackHops, from: number, to?: number): TrackHops {
  return {
    low: low.subarray(from, to),
    peaks: peaks.subarray(from, to),
    body: body.subarray(from, to),
    bright: bright.subarray(from, to),
  };
}
