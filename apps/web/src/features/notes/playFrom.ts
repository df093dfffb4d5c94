import type { Listening } from '../sheet/hooks/useListening';

/** A hit's own attack must be heard too (common practice, no source). */
const beforeS = 0.15;

/** Plays the whole take from a moment on. */
export function playFrom({ seek, playTake }: Pick<Listening, 'seek' | 'playTake'>, timeS: number): void {
  seek(Math.max(0, timeS - beforeS));
  void playTake();
}
