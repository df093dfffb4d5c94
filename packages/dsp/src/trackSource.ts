/** A stretch of bytes that can be read at any place: a disk file, an object, or a browser's File. */
export interface ByteSource {
  readonly sizeBytes: number;
  /**
   * @param into - room that may be filled instead of new memory, if it is large enough; the caller's until the promise ends
   * @returns the bytes from `start` (inclusive) to `end` (exclusive), cut at the end of the source
   */
  read(start: number, end: number, into?: Uint8Array): Promise<Uint8Array>;
}

/** One microphone's samples: mono, full scale ±1.0. */
export interface TrackSource {
  readonly sampleRateHz: number;
  readonly frames: number;
  /** One quantisation step of the file (2^-15 for 16-bit); null for float files. */
  readonly quantisationStep: number | null;
  /** All samples in order, in blocks of bounded size. A block may be reused: copy what must stay. */
  blocks(): AsyncIterable<Float32Array>;
  /**
   * @param into - room that may be filled instead of new memory, if it is large enough; the caller's until the promise ends
   * @returns the samples from `startFrame` to `endFrame` (exclusive); zeros outside the file
   */
  read(startFrame: number, endFrame: number, into?: Float32Array): Promise<Float32Array>;
}
