/**
 * What measuring files takes and nothing else, for programs that want to begin soon: a third of the package is loaded for
 * it, and each file takes a while. The same things as in `index.ts`, and the steps that another thread may take.
 */
export * from './measureTake';
export { encodePairSpectrum } from './measurements/agreement/pairSpectrumBytes';
export type { OverheadFacts } from './measurements/overheadFacts';
export type { PassedTrack, TrackHops } from './measurements/pass/trackPass';
export type { ReadTrackOptions, TrackReading } from './measurements/pass/trackReading';
export { encodePeaks } from './measurements/peaks/peaksBytes';
export type { PairPart } from './measurements/readPairPart';
export {
  createTakeSteps,
  type OverheadRequest,
  type PairPartRequest,
  type TakeSteps,
} from './measurements/takeSteps';
export { openWav, type WavFile } from './wav/openWav';
export { WavError } from './wav/wavError';
