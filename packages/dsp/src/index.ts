export * from './facts';
export * from './trackSource';
export * from './assert';
export * from './decibel';
export * from './wav/aboutChunks';
export type { BroadcastFacts } from './wav/broadcastFacts';
export * from './wav/bytesSource';
export * from './wav/encodeWav';
export * from './wav/openWav';
export { WavError, type WavRefusal } from './wav/wavError';
export * from './wav/wavFacts';
export * from './wav/wavHeader';
export {
  createTrackLevel,
  type TrackLevel,
  type TrackLevelFacts,
  type TrackLevelOptions,
} from './measurements/level/trackLevel';
export * from './measurements/level/truePeak';
export * from './measurements/loudness/kWeighting';
export { createLoudness, type Loudness, type LoudnessOptions } from './measurements/loudness/loudness';
export * from './roles/guessRoles';
export * from './roles/lowEndRatio';
export * from './measureTake';
export * from './measurements/agreement/addedTrack';
export * from './measurements/agreement/choiceLevels';
export { lowEnd, type Band } from './measurements/agreement/choiceEnergy';
export { kickWindow } from './measurements/agreement/pairSpectrum';
export * from './measurements/agreement/pairSpectrumBytes';
export { polarityChanged } from './measurements/agreement/polarityChanged';
export * from './measurements/agreement/shiftedSamples';
export * from './measurements/agreement/sumPeak';
export * from './measurements/agreement/thirdOctaves';
export {
  createPeaks,
  PEAK_FULL_SCALE,
  peakSteps,
  type PeakLevel,
  type TrackPeaks,
} from './measurements/peaks/peaks';
export * from './measurements/peaks/peaksBytes';
export { lowPass } from './measurements/filters/lowPass';
export * from './measurements/comparing/attack';
export type {
  ChangeWord,
  ComparedFigure,
  ComparedKey,
  ComparedReason,
  FigureUnit,
} from './measurements/comparing/comparedFigure';
export * from './measurements/comparing/compareTakes';
export * from './measurements/comparing/interval';
export * from './measurements/comparing/medianDifference';
export * from './measurements/comparing/polarityBetween';
export * from './measurements/comparing/pooledTakes';
export * from './measurements/comparing/rankTryOut';
export * from './measurements/comparing/strengthMatch';
export {
  FEWEST_HITS,
  takeChange,
  worthSteps,
  type Change,
  type TakeChange,
  type WorthStep,
} from './measurements/comparing/takeChange';
export * from './measurements/comparing/tryOutFigures';
export type { ChoiceRule, TryOutMeasure, TryOutReason } from './measurements/comparing/tryOutMeasures';
export * from './measurements/room/absorptionTable';
export * from './measurements/room/modeGroups';
export * from './measurements/room/modePressure';
export * from './measurements/room/reverberation';
export {
  roomModes,
  type RoomMode,
  type RoomModeKind,
  type RoomModesOptions,
  type RoomSize,
} from './measurements/room/roomModes';
export * from './measurements/room/roomReverberation';
export * from './measurements/room/schroederFrequency';
export * from './report/reportTypes';
export * from './report/reportFigures';
export * from './report/pathDifference';
export { levelStatus } from './report/level';
export * from './report/outcomes';
export type { TakeAndNext } from './report/outcomes/outcomeRule';
export * from './findings/findings';
export * from './findings/reportLine';
export * from './findings/nextActions';
export * from './findings/roomChange';
export * from './findings/takeSummary';
export * from './report/comparison/comparedNames';
export * from './report/comparison/comparedPolarity';
export * from './report/comparison/comparisonCaveats';
export * from './report/comparison/comparisonLine';
export * from './report/comparison/doneWords';
