import { useEffect, useRef, useState } from 'react';
import type { MixBranch } from './mixPlan';
import { PairPlayer, type LoopExcerpt } from './pairPlayer';

export type Playing = 'nothing' | 'hit' | 'take';

/** Sound of one sheet: what plays now, and the choice that is heard follows `plan` and `selected` without a gap. */
export function usePairPlayer({
  takeUrl,
  beforeTake,
  plan,
  selected,
}: {
  takeUrl: string;
  /** What a media element can't do by itself: keep the session. */
  beforeTake: () => Promise<void>;
  plan: readonly MixBranch[];
  selected: number;
}) {
  const [media] = useState(() => takeElement(takeUrl));
  const player = useRef<PairPlayer | null>(null);
  const latestRun = useRef(0);
  const [playing, setPlaying] = useState<Playing>('nothing');
  const [failure, setFailure] = useState('');

  useEffect(() => player.current?.update(plan), [plan]);
  useEffect(() => player.current?.select(selected), [selected]);
  useEffect(() => {
    const onEnded = () => setPlaying('nothing');
    media.addEventListener('ended', onEnded);
    return () => {
      media.removeEventListener('ended', onEnded);
      player.current?.close();
      player.current = null;
    };
  }, [media]);

  const begin = async (
    what: Playing,
    start: (player: PairPlayer, wanted: () => boolean) => Promise<void>,
  ) => {
    const run = ++latestRun.current;
    const wanted = () => run === latestRun.current;
    const current = (player.current ??= new PairPlayer(media, plan, selected));
    setFailure('');
    setPlaying(what);
    try {
      await start(current, wanted);
    } catch (error) {
      // Something else was started meanwhile, or the page was left.
      if (!wanted() || player.current !== current) return;
      current.stop();
      setPlaying('nothing');
      setFailure(failureWords(error));
    }
  };

  const stop = () => {
    latestRun.current++;
    player.current?.stop();
    setPlaying('nothing');
  };

  return {
    /** The whole take, for whoever draws its playhead. */
    media,
    playing,
    failure,
    stop,
    playHit: (excerpt: LoopExcerpt) => begin('hit', (p) => p.playLoop(excerpt)),
    playTake: () =>
      begin('take', async (p, wanted) => {
        await beforeTake();
        if (wanted()) await p.playTake();
      }),
    /** Puts the whole take at a time, playing or not. */
    seek: (timeS: number) => seekTo(media, timeS),
  };
}

/** Nothing is loaded before somebody wants to hear it. */
function takeElement(url: string): HTMLAudioElement {
  const element = new Audio();
  element.preload = 'none';
  element.src = url;
  return element;
}

function seekTo(element: HTMLAudioElement, timeS: number) {
  element.currentTime = timeS;
}

function failureWords(error: unknown): string {
  return error instanceof DOMException && error.name === 'NotAllowedError'
    ? 'This browser did not play it. Allow sound for this page, then try again.'
    : 'It could not be loaded. Check the connection, then try again.';
}
