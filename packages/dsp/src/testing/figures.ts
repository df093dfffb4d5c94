import {
  defaultTarget,
  type AgreementReport,
  type ReportFigures,
  type TrackReport,
} from '../report/reportTypes';
import { gainChangeDb, levelOf } from '../report/level';

/** A track as it should be: −8.4 dBFS, quiet; level and gain change follow from what is changed. */
export function trackFigures(change: Partial<TrackReport> = {}): TrackReport {
  const track: TrackReport = {
    samplePeakDbfs: -8.4,
    samplePeakAtS: 4.3,
    truePeakDbtp: -8.3,
    headroomDb: 8.4,
    rmsDbfs: -30,
    crestFactorDb: 21.6,
    integratedLufs: -29.5,
    clipping: { runs: [], runCount: 0, clippedSamples: 0 },
    looksFlattened: false,
    dropouts: { count: 0, firstAtS: null },
    dcOffset: 0,
    noiseFloorDbfs: -72,
    noiseFloorReason: null,
    hum: null,
    loudestHitDbfs: -8.4,
    level: null,
    gainChangeDb: null,
    ...change,
  };
  return { ...track, level: levelOf(track, defaultTarget), gainChangeDb: gainChangeDb(track, defaultTarget) };
}

/** Two microphones that add by 1.4 dB, told surely. */
export function agreementFigures(change: Partial<AgreementReport> = {}): AgreementReport {
  return {
    lowCorrelation: 0.2,
    flipGainRecordedDb: -0.6,
    flipGainMatchedDb: -1.4,
    matchGainDb: 6,
    hitsUsed: 8,
    agreeingHits: 8,
    hitsAlike: 0.97,
    verdict: 'keep',
    sure: true,
    reason: null,
    bands: [
      { lowHz: 30, highHz: 120, flipGainDb: -1.2 },
      { lowHz: 30, highHz: 150, flipGainDb: -1.4 },
      { lowHz: 30, highHz: 200, flipGainDb: -1.6 },
    ],
    lowCut: { flipGainMatchedDb: -1.2, verdict: 'keep' },
    contraryBands: [],
    choices: [],
    ...change,
  };
}

/** A good take; each test says what is different. */
export function reportOf(change: Partial<ReportFigures> = {}): ReportFigures {
  return {
    version: 2,
    sampleRateHz: 48000,
    durationS: 45,
    kick: trackFigures(),
    overhead: trackFigures(),
    hits: Array.from({ length: 8 }, (_, i) => ({
      timeS: 3 + i,
      kind: 'kick' as const,
      kickPeakDbfs: -9,
      overheadPeakDbfs: -15,
    })),
    lateStart: null,
    arrival: {
      arrivalMs: 1.62,
      arrivalSamples: 78,
      arrivalIqrMs: 0.1,
      hitsUsed: 8,
      pathDifferenceM: 0.556,
      confidence: 0.9,
      firstSwing: { kick: 'up', overhead: 'down' },
      reason: null,
    },
    agreement: agreementFigures(),
    balance: null,
    room: null,
    findings: [],
    ...change,
  };
}

/** Clipped at two of the hits of {@link reportOf}, three runs. */
export const clippedTrack = trackFigures({
  samplePeakDbfs: 0,
  loudestHitDbfs: 0,
  clipping: {
    runs: [3.01, 3.02, 5.01].map((timeS) => ({
      startSample: Math.round(timeS * 48000),
      lengthSamples: 5,
      levelDbfs: 0,
    })),
    runCount: 3,
    clippedSamples: 15,
  },
});
export const hotTrack = trackFigures({ samplePeakDbfs: -2.7, loudestHitDbfs: -2.7 });
export const lowTrack = trackFigures({ samplePeakDbfs: -21, loudestHitDbfs: -21, noiseFloorDbfs: -70 });
export const silentTrack = trackFigures({
  samplePeakDbfs: null,
  loudestHitDbfs: null,
  noiseFloorDbfs: null,
  noiseFloorReason: 'digital-silence',
});
/** What is left to tell of the good take where the overhead's file runs 320 ms late. */
export const lateFigures: Pick<ReportFigures, 'lateStart' | 'arrival' | 'agreement'> = {
  lateStart: { overheadLateMs: 320.2, likeness: 0.7 },
  arrival: {
    arrivalMs: null,
    arrivalSamples: null,
    arrivalIqrMs: null,
    hitsUsed: 8,
    pathDifferenceM: null,
    confidence: 0,
    firstSwing: { kick: 'up', overhead: 'down' },
    reason: 'late-start',
  },
  agreement: agreementFigures({
    lowCorrelation: null,
    flipGainRecordedDb: null,
    flipGainMatchedDb: null,
    agreeingHits: 0,
    hitsAlike: null,
    verdict: 'cannot-tell',
    sure: false,
    reason: 'late-start',
    bands: [],
    lowCut: null,
  }),
};
export const flipFigures = agreementFigures({
  verdict: 'flip',
  flipGainMatchedDb: 1.4,
  lowCorrelation: -0.2,
  bands: [120, 150, 200].map((highHz) => ({ lowHz: 30, highHz, flipGainDb: 1.4 })),
  lowCut: { flipGainMatchedDb: 1.1, verdict: 'flip' },
});
