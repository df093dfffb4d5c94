import type { TrackPeaks } from './measurements/peaks/peaks';

/**
 * What one measurement of a take found: facts only. Judgements that depend on the owner's target, temperature or units
 * (level, gain change, path difference, findings, the line) are computed from these on reading.
 */
export interface TakeFacts {
  /** 1: measured before true peak, loudness, hum, balance, room and figures of every hit were; they may be missing. */
  readonly version: 1 | 2;
  readonly sampleRateHz: number;
  /** Of the shorter file. */
  readonly durationS: number;
  readonly tracks: readonly TrackFacts[];
  readonly pairs: readonly PairFacts[];
  readonly hits: readonly HitFacts[];
  readonly notices: readonly FileNotice[];
  /** Missing in facts measured before it was, and in a take without an overhead. */
  readonly balance?: BalanceFacts;
  /** Missing where `balance` is. */
  readonly room?: RoomFacts;
}

export type TrackRole = 'kick' | 'overhead';

export interface ClipRun {
  readonly startSample: number;
  readonly lengthSamples: number;
  readonly levelDbfs: number;
}

export type NoiseFloorReason = 'too-short' | 'no-quiet-second' | 'digital-silence';

/** Mains hum in the quiet stretch. */
export interface HumFacts {
  readonly mainsHz: 50 | 60;
  /** RMS of the multiples found; a full-scale sine reads −3.01. */
  readonly levelDbfs: number;
}

export interface TrackFacts {
  readonly role: TrackRole;
  readonly samplePeakDbfs: number | null;
  readonly samplePeakAtS: number | null;
  /** Missing in facts measured before it was. */
  readonly truePeakDbtp?: number | null;
  readonly headroomDb: number | null;
  readonly rmsDbfs: number | null;
  readonly crestFactorDb: number | null;
  /** Missing in facts measured before it was. */
  readonly integratedLufs?: number | null;
  readonly clipping: {
    /** The first 200. */
    readonly runs: readonly ClipRun[];
    readonly runCount: number;
    readonly clippedSamples: number;
  };
  /** Tops look squashed without standing still; missing in facts measured before it was, as `dropouts`. */
  readonly looksFlattened?: boolean;
  readonly dropouts?: {
    readonly count: number;
    readonly firstAtS: number | null;
  };
  readonly dcOffset: number;
  readonly noiseFloorDbfs: number | null;
  readonly noiseFloorReason: NoiseFloorReason | null;
  /** In the stretch of the noise floor; null where nothing hums or no stretch is quiet. Missing in earlier facts. */
  readonly hum?: HumFacts | null;
  /** Largest peak of this file at any hit; null without hits. */
  readonly loudestHitDbfs: number | null;
}

export type HitKind = 'kick' | 'drum' | 'cymbal' | 'mixed';

export interface HitFacts {
  readonly timeS: number;
  readonly kind: HitKind;
  /** Peak of each track at this hit, dBFS, in the order of `tracks`. */
  readonly peaksDbfs: readonly (number | null)[];
  /** Only of kick hits in a take with an overhead; missing in facts measured before it was. */
  readonly kickFigures?: KickHitFigures;
}

/** What one kick hit alone says, for comparing takes hit by hit. Of the first pair. */
export interface KickHitFigures {
  /** 2–6 kHz over 20 ms against 40–150 Hz over 200 ms in the kick microphone. */
  readonly attackDb: number | null;
  /**
   * 30–150 Hz energy of each microphone and the real part of their cross term, as the pair spectrum adds them up: the two
   * added at polarity s and gain g hold kick + g²·overhead + 2·s·g·cross.
   */
  readonly lowEnergy: { readonly kick: number; readonly overhead: number; readonly cross: number };
  /** Third-octave levels in the overhead, dBFS (RMS over a kick's whole window; a full-scale sine reads −3.01). */
  readonly overheadThirdOctavesDbfs: { readonly hz63: number | null; readonly hz125: number | null };
}

export type BalanceReason = 'too-few-drums' | 'too-few-cymbals' | 'too-few-of-both';

/** How loud cymbals are against drums in the overhead: K-weighted over 400 ms, median over hits that stand alone. */
export interface BalanceFacts {
  readonly drumsLufs: number | null;
  readonly cymbalsLufs: number | null;
  /** Cymbals minus drums. */
  readonly differenceDb: number | null;
  readonly drumHits: number;
  readonly cymbalHits: number;
  readonly reason: BalanceReason | null;
  /** Every hit that was judged; missing in facts measured before it was. */
  readonly perHit?: { readonly drumsLufs: readonly number[]; readonly cymbalsLufs: readonly number[] };
}

/** A median over hits and the distance between the quartiles. */
export interface SpreadFigure {
  readonly median: number;
  readonly iqr: number;
}

/** One octave band of the decay; null where fewer than six hits reach far enough down. */
export interface RoomBandFacts {
  readonly centreHz: number;
  /** From −5 to −25 dB, seconds per 60 dB. */
  readonly t20S: SpreadFigure | null;
  /** From 0 to −10 dB, seconds per 60 dB. */
  readonly earlyS: SpreadFigure | null;
  /** Energy of the first 50 ms over all that comes later. */
  readonly earlyToLateDb: SpreadFigure | null;
  /** Every hit that was judged, also below six; missing in facts measured before it was. */
  readonly perHit?: {
    readonly t20S: readonly number[];
    readonly earlyS: readonly number[];
    readonly earlyToLateDb: readonly number[];
  };
}

/** `too-few-snares`: not six that are loud and stand alone; `cut-short`: they can't be followed far enough down. */
export type RoomReason = 'too-few-snares' | 'cut-short';

/** How a loud snare dies away, as the overhead hears it. */
export interface RoomFacts {
  /** Loud snare hits that were looked at. */
  readonly snareHits: number;
  /** Mean of the 500 Hz and 1 kHz octaves, seconds per 60 dB; null unless both are known. */
  readonly decayS: number | null;
  readonly earlyS: number | null;
  readonly bands: readonly RoomBandFacts[];
  readonly reason: RoomReason | null;
  /** 2–10 kHz against 100 Hz–1 kHz of each snare hit's first 100 ms in the overhead; missing in earlier facts. */
  readonly brightnessPerHitDb?: readonly number[];
}

export type Swing = 'up' | 'down';
export type ArrivalReason =
  'no-kick-hits' | 'too-few-hits' | 'hits-disagree' | 'overhead-silent' | 'methods-disagree' | 'late-start';

export interface ArrivalFacts {
  /** Positive: the second microphone hears the hit later. */
  readonly arrivalMs: number | null;
  readonly arrivalSamples: number | null;
  readonly arrivalIqrMs: number | null;
  readonly hitsUsed: number;
  /** 0–1. */
  readonly confidence: number;
  readonly firstSwing: { readonly kick: Swing | null; readonly overhead: Swing | null };
  readonly reason: ArrivalReason | null;
}

export type Verdict = 'keep' | 'flip' | 'either-way' | 'cannot-tell';
export type VerdictReason =
  | 'no-kick-hits'
  | 'hits-disagree'
  | 'hits-unlike'
  | 'arrival-spread'
  | 'bands-disagree'
  | 'overhead-silent'
  | 'late-start';
export type ChoiceName = 'as-recorded' | 'flipped' | 'shifted' | 'shifted-flipped' | 'best-shift';

/** How the second microphone is played against the first. */
export interface Choice {
  readonly flipped: boolean;
  /** Positive plays the overhead earlier. */
  readonly shiftMs: number;
  /** Positive plays the overhead louder. */
  readonly gainDb: number;
}

export interface NamedChoiceFacts {
  readonly name: ChoiceName;
  readonly flipped: boolean;
  readonly shiftMs: number;
  /** 30–150 Hz of the two added, matched levels, against the power sum; dB, at most +3.01. */
  readonly lowEndDb: number;
  readonly deepest: { readonly centreHz: number; readonly levelDb: number } | null;
}

export interface AgreementFacts {
  readonly lowCorrelation: number | null;
  readonly flipGainRecordedDb: number | null;
  readonly flipGainMatchedDb: number | null;
  readonly matchGainDb: number | null;
  readonly hitsUsed: number;
  readonly agreeingHits: number;
  /**
   * How far all hits tell of the same way between the two microphones, 0–1 (coherence over hits, 30–150 Hz); null without
   * hits, missing in facts measured before it was.
   */
  readonly hitsAlike?: number | null;
  readonly verdict: Verdict;
  readonly sure: boolean;
  readonly reason: VerdictReason | null;
  readonly bands: readonly { readonly lowHz: number; readonly highHz: number; readonly flipGainDb: number }[];
  readonly lowCut: { readonly flipGainMatchedDb: number; readonly verdict: Verdict } | null;
  readonly contraryBands: readonly { readonly centreHz: number; readonly flipGainDb: number }[];
  readonly choices: readonly NamedChoiceFacts[];
}

/** The files of a pair don't start together. */
export interface LateStartFacts {
  /** Positive: the overhead's file runs late, so it is to be played this much earlier. Within 5 ms. */
  readonly overheadLateMs: number;
  /** How alike what is struck in both is once they line up, 0–1. */
  readonly likeness: number;
}

export interface PairFacts {
  /** Indexes into `tracks`; `a` is the kick microphone. */
  readonly a: number;
  readonly b: number;
  /** Null where the files start together or nothing shows that they don't; missing in facts measured before it was. */
  readonly lateStart?: LateStartFacts | null;
  readonly arrival: ArrivalFacts;
  readonly agreement: AgreementFacts;
  /** Size of the pair spectrum stored beside the facts; null without kick hits. */
  readonly spectrum: { readonly binHz: number; readonly binCount: number; readonly hitCount: number } | null;
}

/** Something about the files that a reader should know. */
export type FileNotice =
  | { readonly kind: 'lengths-differ'; readonly byS: number }
  | { readonly kind: 'same-file-twice' }
  | { readonly kind: 'unrelated-files' }
  | { readonly kind: 'cut-short'; readonly role: TrackRole }
  | { readonly kind: 'silent'; readonly role: TrackRole };

/** Skk, Soo and Sko (kick × conj(overhead)) added up over the kick hits; bin i lies at i · binHz. */
export interface PairSpectrum {
  readonly binHz: number;
  readonly hitCount: number;
  readonly skk: Float32Array;
  readonly soo: Float32Array;
  readonly skoRe: Float32Array;
  readonly skoIm: Float32Array;
}

export interface TakeMeasurement {
  readonly facts: TakeFacts;
  /** Outlines, in the order of `facts.tracks`. */
  readonly peaks: readonly TrackPeaks[];
  /** In the order of `facts.pairs`; null where the pair has no kick hit. */
  readonly pairSpectra: readonly (PairSpectrum | null)[];
}
