import { useEffect, useRef, useState } from 'react';

const turnS = 0.32;

interface Turn {
  from: number;
  to: number;
  onUpdate: (at: number) => void;
}
/** Returns what stops it. */
type Turning = (turn: Turn) => () => void;

const jump: Turning = ({ to, onUpdate }) => {
  onUpdate(to);
  return () => undefined;
};

/** The animation weighs as much as all pictures of a sheet, so it comes when the sheet can already be read. */
async function loadTurning(): Promise<Turning> {
  const { animate } = await import('framer-motion');
  return ({ from, to, onUpdate }) => {
    const motion = animate(from, to, { duration: turnS, ease: 'easeInOut', onUpdate });
    return () => motion.stop();
  };
}

const prefersStill = () => window.matchMedia('(prefers-reduced-motion: reduce)').matches;

/**
 * Follows a number with one short motion, so that a flip is seen to turn over. Jumps under reduced motion, and as long
 * as the animation isn't there.
 */
export function useTurn(goal: number): number {
  const [value, setValue] = useState(goal);
  const latest = useRef(goal);
  const turning = useRef<Turning>(jump);
  useEffect(() => {
    const keep = (loaded: Turning) => {
      turning.current = loaded;
    };
    // A picture that jumps is whole; nothing needs to be said.
    loadTurning().then(keep, () => keep(jump));
  }, []);
  useEffect(() => {
    if (latest.current === goal) return;
    const turn = prefersStill() ? jump : turning.current;
    return turn({
      from: latest.current,
      to: goal,
      onUpdate: (at) => {
        latest.current = at;
        setValue(at);
      },
    });
  }, [goal]);
  return value;
}
