import { randomNumbers } from './randomNumbers';

export interface SmallKitOptions {
  readonly sampleRateHz?: number;
  readonly kicks?: number;
  readonly everyS?: number;
  /** How much later the overhead hears the kick. */
  readonly delayMs?: number;
  /** Of the kick in the overhead against the kick microphone; negative turns it over. */
  readonly overheadGain?: number;
  /** A hat on the same instant as each kick and between, in the overhead, with bleed into the kick microphone. */
  readonly hats?: boolean;
  /** How far a kick may come early or late against the even beat. */
  readonly swingS?: number;
  /** Time constant of the drum's ringing; a damped one is shorter. */
  readonly bodyS?: number;
  readonly noise?: number;
  readonly seed?: number;
}

export interface SmallKit {
  readonly sampleRateHz: number;
  readonly kick: Float32Array;
  readonly overhead: Float32Array;
  /** Where each kick begins in the kick microphone, samples. */
  readonly kickAt: readonly number[];
}

/** Jest looks globals up slowly, and these are called some million times. */
const { exp, sin, PI } = Math;

/** Time constants of a damped bass drum and its beater; made up, only their order of size matters. */
const BODY_S = 0.09;
const CLICK_S = 0.004;
const HAT_S = 0.03;

/** A kick written as a formula, so that the overhead can hear exactly the same later by any part of a sample. */
export function smallKit(options: SmallKitOptions = {}): SmallKit {
  const { sampleRateHz = 48000, kicks = 8, everyS = 0.5, delayMs = 0, overheadGain = 0.4 } = options;
  const { swingS = 0, hats = false, noise = 1e-4, seed = 1, bodyS = BODY_S } = options;
  const frames = Math.round(sampleRateHz * (kicks * everyS + 0.5));
  const random = randomNumbers(seed);
  const wave = kickWave(random, bodyS);
  const kick = Float32Array.from({ length: frames }, () => noise * random());
  const overhead = Float32Array.from({ length: frames }, () => noise * random());
  const kickAt = Array.from({ length: kicks }, (_, i) =>
    Math.round(sampleRateHz * (0.25 + i * everyS + (swingS > 0 ? swingS * random() : 0))),
  );
  for (const at of kickAt) {
    const strength = 0.5 + 0.1 * random();
    addWave(kick, { at, sampleRateHz, value: (s) => strength * wave(s) });
    const later = (s: number): number => strength * overheadGain * wave(s - delayMs / 1000);
    addWave(overhead, { at, sampleRateHz, value: later });
  }
  if (hats) {
    for (const at of kickAt.flatMap((start) => [start, start + Math.round((everyS / 2) * sampleRateHz)])) {
      const hat = Float32Array.from({ length: Math.round(0.2 * sampleRateHz) }, () => random());
      const hatAt = (s: number): number => 0.2 * exp(-s / HAT_S) * (hat[Math.round(s * sampleRateHz)] ?? 0);
      addWave(overhead, { at: at + 20, sampleRateHz, value: hatAt });
      addWave(kick, { at: at + 60, sampleRateHz, value: (s) => 0.05 * hatAt(s) });
    }
  }
  return { sampleRateHz, kick, overhead, kickAt };
}

function kickWave(random: () => number, bodyS: number): (seconds: number) => number {
  const tones = Array.from({ length: 24 }, (_, i) => ({
    hz: 300 + i * 130 + 60 * random(),
    phase: 3 * random(),
  }));
  return (s) => {
    if (s < 0) return 0;
    const phase = 2 * PI * (52 * s + 60 * 0.03 * (1 - exp(-s / 0.03)));
    const body = exp(-s / bodyS) * sin(phase);
    if (s > 10 * CLICK_S) return body;
    const click = tones.reduce((sum, tone) => sum + sin(2 * PI * tone.hz * s + tone.phase), 0);
    return body + 0.08 * exp(-s / CLICK_S) * click;
  };
}

function addWave(
  into: Float32Array,
  { at, sampleRateHz, value }: { at: number; sampleRateHz: number; value: (seconds: number) => number },
): void {
  const end = Math.min(into.length, at + Math.round(sampleRateHz * 1.2));
  for (let i = at; i < end; i += 1) into[i] += value((i - at) / sampleRateHz);
}
