import { animate, useReducedMotion } from 'framer-motion';
import { useEffect, useRef, useState } from 'react';

const turnS = 0.32;

/** Follows a number with one short motion, so that a flip is seen to turn over; at once under reduced motion. */
export function useTurn(goal: number): number {
  const still = useReducedMotion();
  const [value, setValue] = useState(goal);
  const latest = useRef(goal);
  useEffect(() => {
    const motion = animate(latest.current, goal, {
      duration: still ? 0 : turnS,
      ease: 'easeInOut',
      onUpdate: (at) => {
        latest.current = at;
        setValue(at);
      },
    });
    return () => motion.stop();
  }, [goal, still]);
  return value;
}
