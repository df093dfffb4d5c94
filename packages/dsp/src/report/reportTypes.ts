import type {
  ArrivalReason,
  BalanceReason,
  ChoiceName,
  ClipRun,
  HitKind,
  HumFacts,
  LateStartFacts,
  NoiseFloorReason,
  RoomReason,
  SpreadFigure,
  Swing,
  Verdict,
  VerdictReason,
} from '../facts';

/** Where the hardest hit should peak, and the level to set the preamp for; dBFS. Common practice, no source. */
export interface Target {
  readonly lowDbfs: number;
  readonly highDbfs: number;
  readonly aimDbfs: number;
}

/** What −12 … −6 dBFS with an aim of −9 stands for until the user changes it; common practice, no published source. */
export const defaultTarget: Target = { lowDbfs: -12, highDbfs: -6, aimDbfs: -9 };

export type LengthUnit = 'metre' | 'foot';

/** Whom a sentence is for. */
export interface Reader {
  readonly lengthUnit: LengthUnit;
  readonly target: Target;
}

export type Level = 'clipped' | 'hot' | 'on-target' | 'low';
export type FindingStatus = 'good' | 'watch' | 'fix' | 'cannot-tell';
export type FindingTopic =
  | 'files'
  | 'late-start'
  | 'kick-level'
  | 'overhead-level'
  | 'noise'
  | 'hum'
  | 'dc-offset'
  | 'flattened'
  | 'overs'
  | 'dropouts'
  | 'arrival'
  | 'adding-up'
  | 'balance'
  | 'room';

export interface TrackReport {
  samplePeakDbfs: number | null;
  samplePeakAtS: number | null;
  /** Null in a take measured before it was, as `integratedLufs`. */
  truePeakDbtp: number | null;
  headroomDb: number | null;
  rmsDbfs: number | null;
  crestFactorDb: number | null;
  integratedLufs: number | null;
  clipping: { runs: ClipRun[]; runCount: number; clippedSamples: number };
  /** Null in a take measured before it was, as `dropouts`. */
  looksFlattened: boolean | null;
  dropouts: { count: number; firstAtS: number | null } | null;
  dcOffset: number;
  noiseFloorDbfs: number | null;
  noiseFloorReason: NoiseFloorReason | null;
  /** Null where nothing hums, where no stretch is quiet, and in a take measured before it was. */
  hum: HumFacts | null;
  loudestHitDbfs: number | null;
  level: Level | null;
  gainChangeDb: number | null;
}

export interface ArrivalReport {
  arrivalMs: number | null;
  arrivalSamples: number | null;
  arrivalIqrMs: number | null;
  hitsUsed: number;
  /** About: arrival times the speed of sound. */
  pathDifferenceM: number | null;
  confidence: number;
  firstSwing: { kick: Swing | null; overhead: Swing | null };
  reason: ArrivalReason | null;
}

export interface AgreementReport {
  lowCorrelation: number | null;
  flipGainRecordedDb: number | null;
  flipGainMatchedDb: number | null;
  matchGainDb: number | null;
  hitsUsed: number;
  agreeingHits: number;
  /** Null without kick hits and in a take measured before it was. */
  hitsAlike: number | null;
  verdict: Verdict;
  sure: boolean;
  reason: VerdictReason | null;
  bands: { lowHz: number; highHz: number; flipGainDb: number }[];
  lowCut: { flipGainMatchedDb: number; verdict: Verdict } | null;
  contraryBands: { centreHz: number; flipGainDb: number }[];
  choices: {
    name: ChoiceName;
    flipped: boolean;
    shiftMs: number;
    lowEndDb: number;
    deepest: { centreHz: number; levelDb: number } | null;
  }[];
}

export interface BalanceReport {
  drumsLufs: number | null;
  cymbalsLufs: number | null;
  /** Cymbals minus drums. */
  differenceDb: number | null;
  drumHits: number;
  cymbalHits: number;
  reason: BalanceReason | null;
}

export interface RoomReport {
  snareHits: number;
  /** Mean of the 500 Hz and 1 kHz octaves, seconds per 60 dB. */
  decayS: number | null;
  earlyS: number | null;
  bands: {
    centreHz: number;
    t20S: SpreadFigure | null;
    earlyS: SpreadFigure | null;
    earlyToLateDb: SpreadFigure | null;
  }[];
  reason: RoomReason | null;
}

export interface Finding {
  topic: FindingTopic;
  status: FindingStatus;
  /** At most 25 words. */
  sentence: string;
  why: string;
  next: string;
}

/** What the command line prints and the API sends; the same shape as the contract of that name. */
export interface ReportFigures {
  version: 1 | 2;
  sampleRateHz: number;
  durationS: number;
  kick: TrackReport;
  overhead: TrackReport;
  hits: { timeS: number; kind: HitKind; kickPeakDbfs: number | null; overheadPeakDbfs: number | null }[];
  /** Null where the files start together, and in a take measured before it was looked at. */
  lateStart: LateStartFacts | null;
  arrival: ArrivalReport;
  agreement: AgreementReport;
  /** Null in a take measured before it was. */
  balance: BalanceReport | null;
  room: RoomReport | null;
  findings: Finding[];
}

export interface LineSentence {
  action: string;
  reason: string;
}

/** Every tick box there is, in order of what matters while nothing clips; what to leave alone comes last. */
export const actionIds = [
  'export-together',
  'flip-overhead',
  'kick-gain',
  'overhead-gain',
  'look-for-noise',
  'leave-silence',
  'record-kicks',
  'compare-polarities',
  'kick-gain-leave',
  'overhead-gain-leave',
  'polarity-leave',
] as const;
export type ActionId = (typeof actionIds)[number];

export interface NextAction {
  id: ActionId;
  action: string;
  detail: string;
  leave: boolean;
}

export interface TakeSummary {
  status: FindingStatus;
  strong: string;
  rest: string;
}

/** What became of one action of the take before: "The flip worked:", "1.3 dB of low end came back; we expected 1.4." */
export interface Outcome {
  actionId: ActionId;
  status: FindingStatus;
  strong: string;
  rest: string;
}
