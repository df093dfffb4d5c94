import { paths } from '@thudline/contracts';
import { useCallback, useEffect, useRef, useState } from 'react';
import { keepSession } from '../../../lib/apiClient';
import type { Listening } from './useListening';

/** Plays one added file at a time, and never together with what the sheet plays. */
export function useAddedListening(takeId: string, sheet: Pick<Listening, 'playing' | 'stop'>) {
  const audio = useRef<HTMLAudioElement | null>(null);
  const [playingId, setPlayingId] = useState<string | null>(null);
  const [failure, setFailure] = useState<string | null>(null);

  const stop = useCallback(() => {
    audio.current?.pause();
    audio.current = null;
    setPlayingId(null);
  }, []);
  useEffect(() => stop, [stop]);
  useEffect(() => {
    // What is paused tells it, and is then let go.
    if (sheet.playing) audio.current?.pause();
  }, [sheet.playing]);

  const play = async (id: string) => {
    stop();
    sheet.stop();
    setFailure(null);
    await keepSession().catch(() => undefined);
    const element = new Audio(paths.addedFileListen(takeId, id));
    audio.current = element;
    setPlayingId(id);
    for (const end of ['ended', 'pause'])
      element.addEventListener(end, () => audio.current === element && stop());
    try {
      await element.play();
    } catch {
      // Stopped while it was starting: nothing failed.
      if (audio.current !== element) return;
      stop();
      setFailure('This file could not be played. Try again.');
    }
  };
  return { playingId, failure, play, stop };
}
