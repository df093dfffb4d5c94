import { useState } from 'react';
import { useTakesPlayer } from '../../../lib/audio/useTakesPlayer';
import { loadTakeSound } from '../../sheet/takeSound';
import type { HeardPlace } from '../hearing';

/** Hearing all takes of a try-out in step and round and round, equally loud, one at a time. */
export function useHearAll(places: readonly HeardPlace[]) {
  const [chosenId, setChosenId] = useState<string | null>(null);
  const heardIndex = Math.max(
    0,
    places.findIndex(({ placeId }) => placeId === chosenId),
  );
  const load = async (_fromS: number, signal: AbortSignal) => ({
    takes: await Promise.all(places.map((place) => loadHeardPlace(place, signal))),
    zerosS: places.map(() => 0),
    startS: 0,
    endS: Infinity,
    loops: true,
  });
  const { play, matchesDb, ...player } = useTakesPlayer({
    key: JSON.stringify(places),
    load,
    selected: heardIndex,
  });
  return {
    ...player,
    /** The place that is heard, or will be. */
    heardId: places[heardIndex]?.placeId ?? null,
    /** How far the loudest is turned down to be as loud as the quietest; null until the sound is there. */
    turnedDownDb: matchesDb && Math.max(0, ...matchesDb.map((matchDb) => -matchDb)),
    play: () => play(0),
    choose: (placeId: string) => {
      if (places.some((place) => place.placeId === placeId)) setChosenId(placeId);
    },
  };
}

export type HearAll = ReturnType<typeof useHearAll>;

/** A flipped overhead comes turned over. */
async function loadHeardPlace({ flipped, overheadGainDb, ...stretch }: HeardPlace, signal: AbortSignal) {
  const sound = await loadTakeSound(stretch, signal);
  const overhead = flipped ? sound.overhead.map((sample) => -sample) : sound.overhead;
  return { sound: { ...sound, overhead }, overheadGainDb };
}
