/** How hits that were found compare with those that were played. */
export interface HitScore {
  readonly played: number;
  readonly found: number;
  readonly right: number;
}

/** Each played hit is found by at most one hit, the nearest within `withinS`. */
export function hitScore(playedS: readonly number[], foundS: readonly number[], withinS: number): HitScore {
  const left = new Set(foundS);
  let right = 0;
  for (const timeS of playedS) {
    const [nearest] = [...left].sort((a, b) => Math.abs(a - timeS) - Math.abs(b - timeS));
    if (nearest === undefined || Math.abs(nearest - timeS) > withinS) continue;
    left.delete(nearest);
    right += 1;
  }
  return { played: playedS.length, found: foundS.length, right };
}

/** Share of what was found that was played. */
export const precision = ({ found, right }: HitScore): number => (found > 0 ? right / found : 1);
/** Share of what was played that was found. */
export const recall = ({ played, right }: HitScore): number => (played > 0 ? right / played : 1);
