import { HOP_MS, hopSamples } from './hopMeter';
import { createLevelHistogram, flooredPowerDb } from './levelHistogram';
import { createRiseFinder, type RiseState } from './riseFinder';

/** A place where the kick microphone's low band rises like a hit. */
export interface KickCandidate {
  /** Where the low band rises most steeply; some milliseconds after the hit began. */
  readonly atSample: number;
  /** Highest 30–150 Hz level of the kick microphone in the 60 ms after the rise began, dB. */
  readonly kickDb: number;
  /** The same of the overhead. */
  readonly overheadDb: number;
}

export interface KickCandidates {
  readonly candidates: readonly KickCandidate[];
  /** 10th percentile of the kick microphone's 30–150 Hz level, dB. */
  readonly floorDb: number;
  /** The same of the overhead. */
  readonly overheadFloorDb: number;
}

/** The 30–150 Hz power of hops of 2 ms, the same stretch of both microphones. */
export interface LowHops {
  readonly kick: Float64Array;
  readonly overhead: Float64Array;
}

export interface KickCandidateFinder {
  push(hops: LowHops): void;
  result(): KickCandidates;
}

/** The band a kick is found in (docs/measurements.md, 3). */
export const LOW_BAND = { lowHz: 30, highHz: 150 };
/** A rise of more than 6 dB in 30 ms; tried on 2,231 real channels. */
const RISE = { riseDb: 6, withinMs: 30, over: 'lowest' } as const;
/**
 * About half a period of 30 Hz, so that the level hardly ripples with the wave itself. Tried from 8 to 36 ms on real hits
 * strung to sixteenths: 8 ms takes ringing for hits, from 24 ms on hits 68 ms apart begin to be missed.
 */
const WINDOW_MS = 16;
const PEAK_AFTER_HOPS = 60 / HOP_MS;
const FLOOR_SHARE = 0.1;

interface OpenCandidate {
  readonly startHop: number;
  steepestHop: number;
  steepest: number;
  kickDb: number;
  overheadDb: number;
}

/**
 * Finds where kick hits may be, in one pass over both microphones and with memory for nothing but the candidates.
 *
 * Which of them are hits is decided by {@link selectKicks} once the whole take is known.
 */
export function createKickCandidates(sampleRateHz: number): KickCandidateFinder {
  const kickRises = createRiseFinder({ windowMs: WINDOW_MS, ...RISE });
  const overheadLevel = createRiseFinder({ windowMs: WINDOW_MS, ...RISE });
  const histogram = createLevelHistogram();
  const overheadHistogram = createLevelHistogram();
  const candidates: KickCandidate[] = [];
  const samplesPerHop = hopSamples(sampleRateHz);
  let open: OpenCandidate | null = null;
  let hop = 0;
  const close = (): void => {
    if (!open) return;
    const { kickDb, overheadDb, steepestHop } = open;
    candidates.push({ atSample: steepestHop * samplesPerHop, kickDb, overheadDb });
    open = null;
  };
  const next = (kickPower: number, overheadPower: number): void => {
    const rise = kickRises.push(kickPower);
    const overheadDb = overheadLevel.push(overheadPower).levelDb;
    histogram.add(rise.levelDb);
    overheadHistogram.add(overheadDb);
    if (rise.begins || (open && hop - open.startHop > PEAK_AFTER_HOPS)) close();
    if (rise.begins) {
      open = { ...nothingYet, startHop: hop, steepestHop: hop };
    }
    if (open) follow(open, rise, { hop, overheadDb });
    hop += 1;
  };
  return {
    push({ kick, overhead }) {
      for (let i = 0; i < kick.length; i += 1) next(kick[i], overhead[i]);
    },
    result() {
      close();
      return {
        candidates,
        floorDb: histogram.percentileDb(FLOOR_SHARE),
        overheadFloorDb: overheadHistogram.percentileDb(FLOOR_SHARE),
      };
    },
  };
}

const nothingYet = { steepest: 0, kickDb: flooredPowerDb(0), overheadDb: flooredPowerDb(0) };

function follow(
  open: OpenCandidate,
  kick: Readonly<RiseState>,
  { hop, overheadDb }: { readonly hop: number; readonly overheadDb: number },
): void {
  open.kickDb = Math.max(open.kickDb, kick.levelDb);
  open.overheadDb = Math.max(open.overheadDb, overheadDb);
  if (kick.rising && kick.addedPower > open.steepest) {
    open.steepest = kick.addedPower;
    open.steepestHop = hop;
  }
}
