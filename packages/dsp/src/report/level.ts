import type { FindingStatus, Level, Target, TrackReport } from './reportTypes';

export interface LevelFigures {
  readonly loudestHitDbfs: number | null;
  readonly clipping: { readonly runCount: number };
}

/** "At least 9 dB down" (measurements.md, 2): how far over the top a clipped hit went can't be seen. Common practice, no source. */
const CLIPPED_CHANGE_DB = -9;
/** A low take is a *watch* below this, or where raising it to the aim lifts the noise above the next one (measurements.md, 2). */
const LOW_WATCH_DBFS = -18;
/** Noise above this is a *watch* (docs/measurements.md, 2). */
export const NOISE_WATCH_DBFS = -60;

/** How the loudest hit stands to the target; anything clipped is *clipped*. @returns null without a hit */
export function levelOf({ loudestHitDbfs, clipping }: LevelFigures, target: Target): Level | null {
  if (clipping.runCount > 0) return 'clipped';
  if (loudestHitDbfs === null) return null;
  if (loudestHitDbfs > target.highDbfs) return 'hot';
  return loudestHitDbfs < target.lowDbfs ? 'low' : 'on-target';
}

/** What to turn the preamp by, dB; for a clipped take the least that helps. @returns null without a hit */
export function gainChangeDb({ loudestHitDbfs, clipping }: LevelFigures, target: Target): number | null {
  const toAim = loudestHitDbfs === null ? null : target.aimDbfs - loudestHitDbfs;
  return clipping.runCount > 0 ? Math.min(CLIPPED_CHANGE_DB, toAim ?? 0) : toAim;
}

/** Where the noise goes when a track is raised to the aim. @returns null where either isn't known */
export function raisedNoiseDbfs(track: TrackReport): number | null {
  return track.noiseFloorDbfs === null || track.gainChangeDb === null
    ? null
    : track.noiseFloorDbfs + track.gainChangeDb;
}

/**
 * Hot is a *watch*, never a *fix*: an unclipped take is a keeper.
 * @example
 * levelStatus(figures.kick) // 'good'
 */
export function levelStatus(track: TrackReport): FindingStatus {
  if (track.level === null) return 'cannot-tell';
  if (track.level === 'clipped') return 'fix';
  if (track.level === 'hot') return 'watch';
  return track.level === 'low' && isTooLow(track) ? 'watch' : 'good';
}

function isTooLow(track: TrackReport): boolean {
  const noise = raisedNoiseDbfs(track);
  return (track.loudestHitDbfs ?? 0) < LOW_WATCH_DBFS || (noise !== null && noise > NOISE_WATCH_DBFS);
}
