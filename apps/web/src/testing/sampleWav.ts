import { encodeWav } from '@thudline/dsp';

/** A short tone as a WAV file: 60 Hz sounds like a kick, 3 kHz like an overhead. */
export function toneFile(
  name: string,
  {
    tonesHz = [60],
    sampleRateHz = 48_000,
    seconds = 0.5,
  }: { tonesHz?: number[]; sampleRateHz?: number; seconds?: number } = {},
): File {
  const frames = Math.round(seconds * sampleRateHz);
  const channels = tonesHz.map((toneHz) =>
    Float32Array.from(
      { length: frames },
      (_, i) => 0.5 * Math.sin((2 * Math.PI * toneHz * i) / sampleRateHz),
    ),
  );
  const bytes = encodeWav({ channels, sampleRateHz, bitDepth: 24 });
  return new File([bytes.slice().buffer], name, { lastModified: Date.now() - 60_000 });
}
