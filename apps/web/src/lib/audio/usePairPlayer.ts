import { useEffect, useRef, useState } from 'react';
import type { MixBranch } from './mixPlan';
import { PairPlayer, type LoopExcerpt } from './pairPlayer';

export type Playing = 'nothing' | 'hit' | 'take';

/** Sound of one sheet: what plays now, and the choice that is heard follows `plan` and `selected` without a gap. */
export function usePairPlayer(takeUrl: string, plan: readonly MixBranch[], selected: number) {
  const [media] = useState(() => takeElement(takeUrl));
  const player = useRef<PairPlayer | null>(null);
  const [playing, setPlaying] = useState<Playing>('nothing');
  const [failure, setFailure] = useState('');

  useEffect(() => player.current?.update(plan), [plan]);
  useEffect(() => player.current?.select(selected), [selected]);
  useEffect(() => {
    const onEnded = () => setPlaying('nothing');
    media.addEventListener('ended', onEnded);
    return () => {
      media.removeEventListener('ended', onEnded);
      void player.current?.close();
      player.current = null;
    };
  }, [media]);

  const begin = async (what: Playing, start: (player: PairPlayer) => Promise<void>) => {
    player.current ??= new PairPlayer(media, plan, selected);
    setFailure('');
    setPlaying(what);
    try {
      await start(player.current);
    } catch {
      player.current.stop();
      setPlaying('nothing');
      setFailure(
        'This browser could not play it. Check that sound is allowed for this page, then try again.',
      );
    }
  };

  const stop = () => {
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
    playTake: () => begin('take', (p) => p.playTake()),
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
