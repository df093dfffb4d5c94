import type { Target } from '@thudline/contracts';
import { useEffect, useRef, useState } from 'react';
import { moveGrip, sameTarget, type Grip } from '../targetGrips';
import { useKept } from './useKept';

/** After the last key so long it is kept: holding an arrow key down is one change. */
const keysSettleMs = 500;

/** The target as it is being moved; kept when the grip is let go of. */
export function useTargetDraft(saved: Target) {
  const { keep, kept, failure } = useKept();
  const [draft, setDraft] = useState<Target | null>(null);
  const newest = useRef<Target | null>(null);
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined);
  useEffect(() => () => clearTimeout(timer.current), []);

  const show = (target: Target | null) => {
    newest.current = target;
    setDraft(target);
  };
  const settle = () => {
    clearTimeout(timer.current);
    const target = newest.current;
    show(null);
    if (target && !sameTarget(target, saved)) void keep({ settings: { target } });
  };
  return {
    target: draft ?? saved,
    kept: kept && draft === null,
    failure,
    move: (grip: Grip, dbfs: number) => show(moveGrip(newest.current ?? saved, grip, dbfs)),
    settle,
    settleSoon: () => {
      clearTimeout(timer.current);
      timer.current = setTimeout(settle, keysSettleMs);
    },
    set: (target: Target) => {
      show(target);
      settle();
    },
  };
}
