import type { AgreementFacts } from '../../facts';
import { pairReading, type PairReading } from '../../measurements/pairReading';
import { readPairPart } from '../../measurements/readPairPart';
import { arrayTrack } from '../arrayTrack';
import { randomNumbers } from '../randomNumbers';
import { smallKit, type SmallKit } from '../smallKit';

type Take = Pick<SmallKit, 'kick' | 'overhead' | 'kickAt' | 'sampleRateHz'>;

const LATEST_S = 0.06;
const HIT_S = 0.35;

/** Reads a made take at the kicks that it holds. */
export async function readMade({ kick, overhead, kickAt, sampleRateHz }: Take): Promise<PairReading> {
  const part = await readPairPart({
    kick: arrayTrack(kick, sampleRateHz),
    overhead: arrayTrack(overhead, sampleRateHz),
    candidates: kickAt.map((at) => ({ atSample: at + 400, kickDb: -10, overheadDb: -20 })),
    from: 0,
    to: kickAt.length,
    onProgress: () => undefined,
  });
  return pairReading([part], sampleRateHz);
}

export async function agreementOf(take: Take): Promise<AgreementFacts> {
  const reading = await readMade(take);
  const hits = reading.kickHits.map(({ peaks }, i) => ({
    timeS: i,
    kind: 'kick' as const,
    peaksDbfs: peaks.map((peak) => 20 * Math.log10(peak)),
  }));
  return reading.agreement(reading.arrival(), hits, { a: 0, b: 1 });
}

/** The overhead of another pass: every hit up to 60 ms early or late. */
export function otherPass({ overhead, kickAt, sampleRateHz }: Take, seed: number): Float32Array {
  const random = randomNumbers(seed);
  const moved = Float32Array.from({ length: overhead.length }, () => 1e-4 * random());
  for (const at of kickAt) {
    const by = Math.round(LATEST_S * sampleRateHz * random());
    for (let i = -200; i < HIT_S * sampleRateHz; i += 1) moved[at + by + i] += overhead[at + i];
  }
  return moved;
}

export interface VerdictsTold {
  readonly pairs: number;
  /** Pairs of different passes that got a verdict, which is false whatever it says. */
  readonly apart: number;
  /** Pairs recorded together that got the right one. */
  readonly together: number;
}

/** Made pairs, each as it is and with the overhead of another pass. */
export async function verdictsTold({
  pairs,
  kicks,
}: {
  readonly pairs: number;
  readonly kicks: number;
}): Promise<VerdictsTold> {
  let [apart, together] = [0, 0];
  for (let seed = 1; seed <= pairs; seed += 1) {
    const isTurned = seed % 2 === 0;
    const delayMs = 1 + 0.1 * (seed % 12);
    const kit = smallKit({ seed, kicks, delayMs, overheadGain: isTurned ? -0.4 : 0.4 });
    const other = await agreementOf({ ...kit, overhead: otherPass(kit, seed) });
    if (other.verdict !== 'cannot-tell') apart += 1;
    if ((await agreementOf(kit)).verdict === (isTurned ? 'flip' : 'keep')) together += 1;
  }
  return { pairs, apart, together };
}
