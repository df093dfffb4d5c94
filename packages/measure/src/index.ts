export * from './addFiles';
export type { AddJob, AddJobResult } from './addJob';
export * from './fileByteSource';
export * from './measureFiles';
export * from './measureRefusal';
export type { TrackChoice } from './trackChoice';
export type { MeasureJob, MeasureJobResult, MeasureProgress } from './worker';
