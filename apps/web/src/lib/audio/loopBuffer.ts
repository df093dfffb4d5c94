/** Both ends of a loop fade, so that it closes without a click. */
const fadeInS = 0.003;
const fadeOutS = 0.03;

/** A copy of a track whose ends fade alike; the middle is untouched. */
export function loopEnds(samples: Float32Array, sampleRateHz: number): Float32Array<ArrayBuffer> {
  const out = Float32Array.from(samples);
  const inFrames = Math.min(Math.round(fadeInS * sampleRateHz), out.length >> 1);
  const outFrames = Math.min(Math.round(fadeOutS * sampleRateHz), out.length >> 1);
  for (let i = 0; i < inFrames; i++) out[i] *= i / inFrames;
  for (let i = 0; i < outFrames; i++) out[out.length - 1 - i] *= i / outFrames;
  return out;
}
