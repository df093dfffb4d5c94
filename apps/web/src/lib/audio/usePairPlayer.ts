import { useEffect, useRef, useState } from 'react';
import type { MixBranch } from './mixPlan';
import { PairPlayer, type LoopExcerpt } from './pairPlayer';

export type Playing = 'nothing' | 'hit' | 'take';

/** Sound of one sheet: what plays now, and the choice that is heard follows `plan` and `selected` without a gap. */
export function usePairPlayer(plan: readonly MixBranch[], selected: number) {
  const player = useRef<PairPlayer | null>(null);
  const [playing, setPlaying] = useState<Playing>('nothing');
  const [failure, setFailure] = useState('');

  useEffect(() => player.current?.update(plan), [plan]);
  useEffect(() => player.current?.select(selected), [selected]);
  useEffect(
    () => () => {
      void player.current?.close();
      player.current = null;
    },
    [],
  );

  const begin = async (what: Playing, start: (player: PairPlayer) => Promise<void>) => {
    player.current ??= new PairPlayer(plan, selected);
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
    playing,
    failure,
    stop,
    playHit: (excerpt: LoopExcerpt) => begin('hit', (p) => p.playLoop(excerpt)),
    playTake: (url: string) => begin('take', (p) => p.playTake(url, () => setPlaying('nothing'))),
  };
}
