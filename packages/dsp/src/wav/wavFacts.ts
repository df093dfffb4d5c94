import type { BroadcastFacts } from './broadcastFacts';

/** What the header of a WAV file says, with what is really there. */
export interface WavFacts {
  readonly encoding: 'pcm' | 'float';
  /** Size of one sample in the file, its container: 8, 16, 24, 32 or 64. */
  readonly bitsPerSample: number;
  /** Bits that carry sound, left-justified in the container; at most `bitsPerSample`. */
  readonly validBits: number;
  readonly channels: number;
  readonly sampleRateHz: number;
  /** Whole frames that are there. */
  readonly frames: number;
  /** Where the first frame begins, in bytes from the start of the file. */
  readonly dataOffset: number;
  /** Bytes from one frame to the next. */
  readonly blockAlign: number;
  /** The header claimed more sound than the file holds, or did not say how much there is. */
  readonly cutShort: boolean;
  readonly durationS: number;
  /** Such as `24-bit PCM` or `32-bit float`. */
  readonly encodingName: string;
  /** What the recorder wrote into the file; null where it has no `bext` chunk, or an empty one. */
  readonly broadcast: BroadcastFacts | null;
}

/** How samples lie in the file. */
export type SampleFormat = Pick<
  WavFacts,
  'encoding' | 'bitsPerSample' | 'validBits' | 'channels' | 'sampleRateHz' | 'blockAlign'
>;
