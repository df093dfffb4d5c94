/** wav-decoder ships no types; what is used of version 1.3.0. */
declare module 'wav-decoder' {
  interface DecodedAudio {
    numberOfChannels: number;
    length: number;
    sampleRate: number;
    channelData: Float32Array[];
  }

  interface DecodeOptions {
    /** Divides by 2^(N−1) on both sides of zero (8-bit excepted). */
    symmetric?: boolean;
  }

  interface WavDecoder {
    decode: {
      (buffer: ArrayBuffer, options?: DecodeOptions): Promise<DecodedAudio>;
      sync(buffer: ArrayBuffer, options?: DecodeOptions): DecodedAudio;
    };
  }

  const decoder: WavDecoder;
  export = decoder;
}
