import type { HitFacts, TakeFacts, TrackFacts } from '../facts';
import { seededRandom } from '../measurements/comparing/seededRandom';

export interface MadeTake {
  readonly kicks?: number;
  readonly drums?: number;
  readonly seed?: number;
  /** Middle of the kick-file peaks at kick hits, and how far single hits stray; dBFS and dB. */
  readonly kickDbfs?: number;
  readonly spreadDb?: number;
  /** 30–150 Hz, levels matched: how alike the microphones are, −1 … 1, and how far single hits stray. */
  readonly correlation?: number;
  readonly correlationSpread?: number;
  readonly attackDb?: number;
  readonly overhead63Dbfs?: number;
  readonly drumInKickDbfs?: number;
  readonly arrivalMs?: number;
  readonly decayS?: number;
  readonly cymbalsLufs?: number;
  readonly noiseDbfs?: number | null;
  /** False: as measured before each hit was kept. */
  readonly hitsKept?: boolean;
}

/** Facts of a take written down from what they should say, strayed by seeded noise. */
export function takeFacts(made: MadeTake = {}): TakeFacts {
  const { kicks = 16, drums = 12, seed = 1, kickDbfs = -9, spreadDb = 1, hitsKept = true } = made;
  const random = seededRandom(seed);
  /** Uniform, with the standard deviation told. */
  const near = (middle: number, sigma: number): number => middle + Math.sqrt(12) * sigma * (random() - 0.5);
  const { decayS = 0.4, cymbalsLufs = -24, attackDb = -20, drumInKickDbfs = -30 } = made;
  const { correlation = 0.2, correlationSpread = 0.03, overhead63Dbfs = -40, arrivalMs = 1.6 } = made;
  const times = (count: number, value: () => number): number[] => Array.from({ length: count }, value);
  const kickHits = Array.from({ length: kicks }, (_, i): HitFacts => {
    const peakDbfs = near(kickDbfs, spreadDb);
    const energy = 1000 * Math.pow(10, peakDbfs / 10);
    const figures = {
      attackDb: near(attackDb, 0.5),
      // The overhead is half as loud; the gain that matches it is 6 dB.
      lowEnergy: {
        kick: energy,
        overhead: energy / 4,
        cross: (energy / 2) * near(correlation, correlationSpread),
      },
      overheadThirdOctavesDbfs: { hz63: near(overhead63Dbfs, 0.5), hz125: near(overhead63Dbfs - 5, 0.5) },
    };
    return {
      timeS: 1 + i,
      kind: 'kick',
      peaksDbfs: [peakDbfs, peakDbfs - 6.0206],
      ...(hitsKept && { kickFigures: figures }),
    };
  });
  const drumHits = Array.from({ length: drums }, (_, i): HitFacts => ({
    timeS: 1.5 + i,
    kind: 'drum',
    peaksDbfs: [near(drumInKickDbfs, 0.5), -12],
  }));
  const t20S = times(drums, () => near(decayS, decayS / 50));
  const earlyToLateDb = times(drums, () => near(8, 0.5));
  const spread = (median: number) => ({ median, iqr: 0.1 });
  return {
    version: 1,
    sampleRateHz: 48000,
    durationS: 45,
    tracks: [track('kick', kickDbfs + 2, made), track('overhead', kickDbfs - 4, made)],
    pairs: [
      {
        a: 0,
        b: 1,
        arrival: {
          arrivalMs,
          arrivalSamples: Math.round(48 * arrivalMs),
          arrivalIqrMs: 0.1,
          hitsUsed: kicks,
          confidence: 0.9,
          firstSwing: { kick: 'up', overhead: 'up' },
          reason: null,
        },
        agreement: {
          lowCorrelation: correlation,
          flipGainRecordedDb: 0,
          flipGainMatchedDb: 0,
          matchGainDb: 6.0206,
          hitsUsed: kicks,
          agreeingHits: kicks,
          hitsAlike: 0.97,
          verdict: 'keep',
          sure: true,
          reason: null,
          bands: [],
          lowCut: null,
          contraryBands: [],
          choices: [],
        },
        spectrum: { binHz: 48000 / 16384, binCount: 4097, hitCount: kicks },
      },
    ],
    hits: [...kickHits, ...drumHits].sort((a, b) => a.timeS - b.timeS),
    notices: [],
    balance: {
      drumsLufs: -26,
      cymbalsLufs,
      differenceDb: cymbalsLufs + 26,
      drumHits: drums,
      cymbalHits: drums,
      reason: null,
      ...(hitsKept && {
        perHit: {
          drumsLufs: times(drums, () => near(-26, 0.5)),
          cymbalsLufs: times(drums, () => near(cymbalsLufs, 0.5)),
        },
      }),
    },
    room: {
      snareHits: drums,
      decayS,
      earlyS: decayS,
      bands: [500, 1000, 2000, 4000].map((centreHz) => ({
        centreHz,
        t20S: spread(decayS),
        earlyS: spread(decayS),
        earlyToLateDb: spread(8),
        ...(hitsKept && { perHit: { t20S, earlyS: t20S, earlyToLateDb } }),
      })),
      reason: null,
      ...(hitsKept && { brightnessPerHitDb: times(drums, () => near(2, 0.4)) }),
    },
  };
}

function track(role: TrackFacts['role'], peakDbfs: number, { noiseDbfs = -70 }: MadeTake): TrackFacts {
  return {
    role,
    samplePeakDbfs: peakDbfs,
    samplePeakAtS: 3,
    headroomDb: -peakDbfs,
    rmsDbfs: peakDbfs - 20,
    crestFactorDb: 20,
    clipping: { runs: [], runCount: 0, clippedSamples: 0 },
    dcOffset: 0,
    noiseFloorDbfs: noiseDbfs,
    noiseFloorReason: noiseDbfs === null ? 'no-quiet-second' : null,
    loudestHitDbfs: peakDbfs,
  };
}
