export * from './fileByteSource';
export * from './measureRefusal';
export type { TrackChoice } from './trackChoice';
