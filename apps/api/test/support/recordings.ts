import { UploadTrack } from '@thudline/contracts';
import { encodeWav } from '@thudline/dsp';

export interface UploadFile {
  name: string;
  bytes: Uint8Array;
}

/** A decaying tone, so that samples differ from one another and from file to file. */
export function tone(frames: number, hz: number, sampleRateHz = 48_000): Float32Array {
  return Float32Array.from(
    { length: frames },
    (_, i) => 0.5 * Math.exp((-3 * i) / frames) * Math.sin((2 * Math.PI * hz * i) / sampleRateHz),
  );
}

export const monoTracks: UploadTrack[] = [
  { role: 'kick', fileIndex: 0, channel: 0 },
  { role: 'overhead', fileIndex: 1, channel: 0 },
];

export const stereoTracks: UploadTrack[] = [
  { role: 'kick', fileIndex: 0, channel: 1 },
  { role: 'overhead', fileIndex: 0, channel: 0 },
];

/** Half a second of two mono files: enough to be stored and read, too little to be judged. */
export function shortTake(): { files: UploadFile[]; tracks: UploadTrack[] } {
  return {
    files: [
      { name: 'kick.wav', bytes: wav([tone(24_000, 60)]) },
      { name: 'overhead.wav', bytes: wav([tone(24_000, 75)]) },
    ],
    tracks: monoTracks,
  };
}

export function wav(channels: Float32Array[], sampleRateHz = 48_000): Uint8Array {
  return encodeWav({ channels, sampleRateHz, bitDepth: 24 });
}
