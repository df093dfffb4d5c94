import type { ReportResponse } from '@thudline/contracts';
import { useEffect, useMemo, useRef, useState } from 'react';
import { matchedTakes } from '../../../lib/audio/matchedTakes';
import { TakesPlayer } from '../../../lib/audio/takesPlayer';
import { commonTime } from '../commonTime';
import { loadTakeSound } from '../takeSound';

/** Which of the two is heard: the take before or the take after. */
export type Heard = 0 | 1;
type State = 'stopped' | 'loading' | 'playing';

/** Hearing two takes in step, equally loud, with a switch between them. Nothing is loaded before somebody wants to hear it. */
export function useTwoTakes(reports: readonly [ReportResponse, ReportResponse]) {
  const [state, setState] = useState<State>('stopped');
  const [heard, setHeard] = useState<Heard>(1);
  const [matchesDb, setMatchesDb] = useState<readonly number[] | null>(null);
  const [failure, setFailure] = useState('');
  const time = useMemo(() => commonTime(reports), [reports]);
  const player = useRef<TakesPlayer | null>(null);
  const loading = useRef<AbortController | null>(null);
  const latestHeard = useRef<Heard>(heard);

  useEffect(
    () => () => {
      loading.current?.abort();
      player.current?.close();
      player.current = null;
    },
    [],
  );

  const load = async (signal: AbortSignal): Promise<TakesPlayer> => {
    const sounds = await Promise.all(reports.map((report) => loadTakeSound(report, signal)));
    const takes = matchedTakes(
      sounds.map((sound, i) => ({ sound, overheadGainDb: reports[i].agreement.matchGainDb ?? 0 })),
    );
    signal.throwIfAborted();
    setMatchesDb(takes.map(({ matchDb }) => matchDb));
    return new TakesPlayer(takes, time.zerosS, latestHeard.current, () => setState('stopped'));
  };

  const play = async (fromS: number) => {
    loading.current?.abort();
    const asked = (loading.current = new AbortController());
    setFailure('');
    setState(player.current ? 'playing' : 'loading');
    try {
      player.current ??= await load(asked.signal);
      if (asked.signal.aborted) return;
      setState('playing');
      await player.current.play(fromS);
    } catch (error) {
      if (asked.signal.aborted) return;
      setState('stopped');
      setFailure(failureWords(error));
    }
  };

  const stop = () => {
    loading.current?.abort();
    player.current?.stop();
    setState('stopped');
  };

  const choose = (which: Heard) => {
    latestHeard.current = which;
    setHeard(which);
    player.current?.select(which);
  };

  return {
    time,
    state,
    heard,
    /** How far each is turned down to be as loud as the other; null until the sound is there. */
    matchesDb,
    failure,
    play: (fromS: number) => void play(fromS),
    stop,
    choose,
    /** On the common time; null while nothing plays. */
    positionS: () => (state === 'playing' ? (player.current?.positionS() ?? null) : null),
  };
}

export type TwoTakes = ReturnType<typeof useTwoTakes>;

function failureWords(error: unknown): string {
  return error instanceof DOMException && error.name === 'NotAllowedError'
    ? 'This browser did not play it. Allow sound for this page, then try again.'
    : 'The takes could not be loaded. Check the connection, then try again.';
}
