import type { SmallKit } from './smallKit';

/** What happens to a made take: to one microphone, or to what is struck beside the kick. */
type Random = () => number;
type Rate = Pick<SmallKit, 'sampleRateHz'>;

const { exp, sin, PI } = Math;

/** 20 ms of nothing, three times a second, at places that have to do with no hit. */
export function dropouts(samples: Float32Array, { sampleRateHz }: Rate, random: Random): void {
  for (let at = 0; at < samples.length; at += sampleRateHz / 3) {
    const start = Math.round(at + 0.1 * sampleRateHz * (1 + random()));
    samples.fill(0, start, start + Math.round(0.02 * sampleRateHz));
  }
}

/** A crash that rings through the take: bright noise that halves every second. */
export function crash(samples: Float32Array, { sampleRateHz }: Rate, random: Random): void {
  let before = 0;
  for (let i = 0; i < samples.length; i += 1) {
    const noise = random();
    samples[i] += 0.05 * 0.5 ** (i / sampleRateHz) * (noise - before);
    before = noise;
  }
}

/** Walls: the same sound again, softer, 3 to 40 ms later. */
export function walls(samples: Float32Array, { sampleRateHz }: Rate, random: Random): void {
  echoes(
    samples,
    Array.from({ length: 8 }, () => ({
      by: Math.round((0.0215 + 0.0185 * random()) * sampleRateHz),
      gain: 0.3 * random(),
    })),
  );
}

/** A wall or a floor beside the microphone: 3 to 11 ms later, some as loud as the way through the air. */
export function earlyEchoes(samples: Float32Array, { sampleRateHz }: Rate, random: Random): void {
  echoes(
    samples,
    Array.from({ length: 6 }, () => ({
      by: Math.round((0.007 + 0.004 * random()) * sampleRateHz),
      gain: 0.6 * random(),
    })),
  );
}

function echoes(
  samples: Float32Array,
  ways: readonly { readonly by: number; readonly gain: number }[],
): void {
  for (let i = samples.length - 1; i >= 0; i -= 1)
    for (const { by, gain } of ways) if (i >= by) samples[i] += gain * samples[i - by];
}

export function quieter(samples: Float32Array): void {
  for (let i = 0; i < samples.length; i += 1) samples[i] *= 0.01;
}

export function clipped(samples: Float32Array): void {
  for (let i = 0; i < samples.length; i += 1) samples[i] = Math.max(-0.3, Math.min(0.3, samples[i]));
}

/** The kick microphone hears what the overhead hears, 3 ms later. */
export function bleed({ kick, overhead, sampleRateHz }: SmallKit): void {
  const by = Math.round(0.003 * sampleRateHz);
  for (let i = by; i < kick.length; i += 1) kick[i] += 0.1 * overhead[i - by];
}

/** Hats on the instant of each kick and evenly between: bright noise. */
export function sticks({
  level,
  perKick,
  unevenMs = 0,
}: {
  readonly level: number;
  readonly perKick: number;
  readonly unevenMs?: number;
}): (kit: SmallKit, random: Random) => void {
  return (kit, random) => {
    for (const start of struckAt(kit, perKick)) {
      let before = 0;
      const uneven = unevenMs > 0 ? (unevenMs / 1000) * kit.sampleRateHz * random() : 0;
      strike(kit, { at: Math.round(start + uneven), lengthS: 0.2, bleed: 0.05, bleedS: 0.0008 }, (s) => {
        const noise = random();
        const bright = 0.7 * (noise - before);
        before = noise;
        return level * exp(-s / 0.03) * bright;
      });
    }
  };
}

/** A snare between the kicks, or on the instant of each: noise and a tone. */
export function snares({
  bleed: gain,
  onKick = false,
}: {
  readonly bleed: number;
  readonly onKick?: boolean;
}): (kit: SmallKit, random: Random) => void {
  return (kit, random) => {
    const at = onKick ? kit.kickAt : struckAt(kit, 2).filter((_, i) => i % 2 === 1);
    for (const start of at)
      strike(kit, { at: start, lengthS: 0.15, bleed: gain, bleedS: 0.002 }, (s) => {
        return 0.3 * exp(-s / 0.05) * (random() + 0.7 * sin(2 * PI * 190 * s));
      });
  };
}

/** Each kick's place and as many between it and the next as are asked for. */
function struckAt({ kickAt, sampleRateHz }: SmallKit, perKick: number): number[] {
  const gap = kickAt.length > 1 ? kickAt[1] - kickAt[0] : sampleRateHz / 2;
  return kickAt.flatMap((start) => Array.from({ length: perKick }, (_, i) => start + (i * gap) / perKick));
}

function strike(
  { kick, overhead, sampleRateHz }: SmallKit,
  options: { readonly at: number; readonly lengthS: number; readonly bleed: number; readonly bleedS: number },
  value: (seconds: number) => number,
): void {
  const at = Math.max(0, Math.round(options.at));
  const later = at + Math.round(options.bleedS * sampleRateHz);
  for (let i = 0; i < options.lengthS * sampleRateHz && later + i < kick.length; i += 1) {
    const x = value(i / sampleRateHz);
    overhead[at + i] += x;
    kick[later + i] += options.bleed * x;
  }
}
