import { useEffect, useRef, useState } from 'react';
import { matchedTakes, type TakeSound } from './matchedTakes';
import { TakesPlayer } from './takesPlayer';

type State = 'stopped' | 'loading' | 'playing';

/** A stretch of the common time with its sound. */
export interface HeardStretch {
  takes: readonly { sound: TakeSound; overheadGainDb: number }[];
  /** Where the common time is 0 in each sound. */
  zerosS: readonly number[];
  startS: number;
  /** Exclusive. */
  endS: number;
  loops?: boolean;
  /** Where the takes go on after this stretch; absent where they end. */
  goesOnAtS?: number;
}

interface ToHear {
  /** Names the sounds: what is told of others no longer holds, and what was loaded of them is let go. */
  key: string;
  load: (fromS: number, signal: AbortSignal) => Promise<HeardStretch>;
  /** Index of the take that is heard. */
  selected: number;
}

/** Takes in step, equally loud, one of them heard. Nothing is loaded before somebody wants to hear it. */
export function useTakesPlayer({ key, load, selected }: ToHear) {
  const [told, setTold] = useState<{ key: string; state: State }>({ key, state: 'stopped' });
  const [matched, setMatched] = useState<{ key: string; matchesDb: readonly number[] } | null>(null);
  const [failure, setFailure] = useState('');
  const loaded = useRef<{ stretch: HeardStretch; player: TakesPlayer } | null>(null);
  const loading = useRef<AbortController | null>(null);
  const latest = useRef(selected);
  const state = told.key === key ? told.state : 'stopped';
  const setState = (next: State) => setTold({ key, state: next });

  useEffect(() => {
    latest.current = selected;
    loaded.current?.player.select(selected);
  }, [selected]);
  useEffect(
    () => () => {
      loading.current?.abort();
      loaded.current?.player.close();
      loaded.current = null;
    },
    [key],
  );

  const playerAt = async (fromS: number, signal: AbortSignal): Promise<TakesPlayer> => {
    const there = loaded.current;
    if (there && fromS >= there.stretch.startS && fromS < there.stretch.endS) return there.player;
    there?.player.close();
    loaded.current = null;
    const stretch = await load(fromS, signal);
    signal.throwIfAborted();
    const takes = matchedTakes(stretch.takes);
    setMatched({ key, matchesDb: takes.map(({ matchDb }) => matchDb) });
    const { zerosS, loops, goesOnAtS } = stretch;
    const onEnded = () => (goesOnAtS === undefined ? setState('stopped') : void play(goesOnAtS));
    const player = new TakesPlayer({ takes, zerosS, loops, selected: latest.current, onEnded });
    loaded.current = { stretch, player };
    return player;
  };

  const play = async (fromS: number) => {
    loading.current?.abort();
    const { signal } = (loading.current = new AbortController());
    setFailure('');
    setState(loaded.current ? 'playing' : 'loading');
    try {
      const player = await playerAt(fromS, signal);
      setState('playing');
      await player.play(fromS);
    } catch (error) {
      if (signal.aborted) return;
      setState('stopped');
      setFailure(failureWords(error));
    }
  };

  return {
    state,
    /** How far each take is turned down to be as loud as the quietest; null until the sound is there. */
    matchesDb: matched?.key === key ? matched.matchesDb : null,
    failure,
    play: (fromS: number) => void play(fromS),
    stop: () => {
      loading.current?.abort();
      loaded.current?.player.stop();
      setState('stopped');
    },
    /** On the common time; null while nothing plays. */
    positionS: () => (state === 'playing' ? (loaded.current?.player.positionS() ?? null) : null),
  };
}

function failureWords(error: unknown): string {
  return error instanceof DOMException && error.name === 'NotAllowedError'
    ? 'This browser did not play it. Allow sound for this page, then try again.'
    : 'The takes could not be loaded. Check the connection, then try again.';
}
