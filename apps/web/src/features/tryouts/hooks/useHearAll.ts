import { useEffect, useRef, useState } from 'react';
import { matchedTakes } from '../../../lib/audio/matchedTakes';
import { TakesPlayer } from '../../../lib/audio/takesPlayer';
import type { HeardPlace } from '../hearing';
import { loadHeardPlace } from '../tryOutSound';

type State = 'stopped' | 'loading' | 'playing';

/** Hearing all takes of a try-out in step, equally loud, one at a time. Nothing is loaded before it is wanted. */
export function useHearAll(places: readonly HeardPlace[]) {
  const key = JSON.stringify(places);
  const [told, setTold] = useState<{ key: string; state: State }>({ key, state: 'stopped' });
  const [chosenId, setChosenId] = useState<string | null>(null);
  const [matched, setMatched] = useState<{ key: string; turnedDownDb: number } | null>(null);
  const [failure, setFailure] = useState('');
  const player = useRef<TakesPlayer | null>(null);
  const loading = useRef<AbortController | null>(null);
  const heardIndex = Math.max(
    0,
    places.findIndex(({ placeId }) => placeId === chosenId),
  );
  const latestIndex = useRef(heardIndex);
  // Other takes or polarities are other sounds: what is told of the earlier ones no longer holds.
  const state = told.key === key ? told.state : 'stopped';
  const setState = (next: State) => setTold({ key, state: next });

  const end = () => {
    loading.current?.abort();
    player.current?.close();
    player.current = null;
  };
  // … and what was loaded is let go.
  useEffect(() => end, [key]);

  const load = async (signal: AbortSignal): Promise<TakesPlayer> => {
    const sounds = await Promise.all(places.map((place) => loadHeardPlace(place, signal)));
    signal.throwIfAborted();
    const takes = matchedTakes(
      sounds.map((sound, i) => ({ sound, overheadGainDb: places[i].overheadGainDb })),
    );
    setMatched({ key, turnedDownDb: Math.max(0, ...takes.map(({ matchDb }) => -matchDb)) });
    return new TakesPlayer(
      takes,
      takes.map(() => 0),
      latestIndex.current,
      () => setState('stopped'),
    );
  };

  const play = async () => {
    loading.current?.abort();
    const asked = (loading.current = new AbortController());
    setFailure('');
    setState(player.current ? 'playing' : 'loading');
    try {
      player.current ??= await load(asked.signal);
      if (asked.signal.aborted) return;
      setState('playing');
      await player.current.play(0);
    } catch (error) {
      if (asked.signal.aborted) return;
      setState('stopped');
      setFailure(failureWords(error));
    }
  };

  return {
    state,
    /** The place that is heard, or will be. */
    heardId: places[heardIndex]?.placeId ?? null,
    /** How far the loudest is turned down to be as loud as the quietest; null until the sound is there. */
    turnedDownDb: matched?.key === key ? matched.turnedDownDb : null,
    failure,
    play: () => void play(),
    stop: () => {
      loading.current?.abort();
      player.current?.stop();
      setState('stopped');
    },
    choose: (placeId: string) => {
      const index = places.findIndex((place) => place.placeId === placeId);
      if (index === -1) return;
      latestIndex.current = index;
      setChosenId(placeId);
      player.current?.select(index);
    },
  };
}

export type HearAll = ReturnType<typeof useHearAll>;

function failureWords(error: unknown): string {
  return error instanceof DOMException && error.name === 'NotAllowedError'
    ? 'This browser did not play it. Allow sound for this page, then try again.'
    : 'The takes could not be loaded. Check the connection, then try again.';
}
