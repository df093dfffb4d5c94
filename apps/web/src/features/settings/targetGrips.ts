import { defaultUserSettings, type Target } from '@thudline/contracts';

export type Grip = 'lowDbfs' | 'highDbfs' | 'aimDbfs';

/** What the contract allows for each of the three. */
export const targetLimits = { lowestDbfs: -40, highestDbfs: -1 } as const;
export const gripStepDb = 0.5;

/** How far one grip may go while the others stay: the ends keep a step apart, the aim stays between them. */
export function gripLimits({ lowDbfs, highDbfs }: Target, grip: Grip): { minDbfs: number; maxDbfs: number } {
  const { lowestDbfs, highestDbfs } = targetLimits;
  if (grip === 'lowDbfs') return { minDbfs: lowestDbfs, maxDbfs: highDbfs - gripStepDb };
  if (grip === 'highDbfs') return { minDbfs: lowDbfs + gripStepDb, maxDbfs: highestDbfs };
  return { minDbfs: lowDbfs, maxDbfs: highDbfs };
}

const within = (value: number, min: number, max: number) => Math.min(max, Math.max(min, value));

/** The target with one grip moved, snapped to half a decibel; an end that passes the aim takes it along. */
export function moveGrip(target: Target, grip: Grip, dbfs: number): Target {
  const { minDbfs, maxDbfs } = gripLimits(target, grip);
  const snapped = Math.round(dbfs / gripStepDb) * gripStepDb;
  const moved = { ...target, [grip]: within(snapped, minDbfs, maxDbfs) };
  return { ...moved, aimDbfs: within(moved.aimDbfs, moved.lowDbfs, moved.highDbfs) };
}

export const sameTarget = (a: Target, b: Target) =>
  a.lowDbfs === b.lowDbfs && a.highDbfs === b.highDbfs && a.aimDbfs === b.aimDbfs;

/** Common practice, no published source. */
export const usualTarget = defaultUserSettings.target;
