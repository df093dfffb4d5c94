import { createKickCandidates } from '../../measurements/hits/kickCandidates';
import { selectKicks } from '../../measurements/hits/selectKicks';
import { smallKit, type SmallKit } from '../smallKit';
import { eachLowBand } from './lowBands';

const { exp, sin, PI } = Math;

export interface KicksFound {
  readonly precision: number;
  readonly recall: number;
}

const KITS = 5;
const WITHIN_S = 0.05;
const SOFTER = 0.316;

/** Kicks with low toms between them; every other kick 10 dB softer where asked. */
export function kicksAmongToms({ isSofter }: { readonly isSofter: boolean }): KicksFound {
  const kits = Array.from({ length: KITS }, (_, i) => smallKit({ seed: i + 1, kicks: 10, delayMs: 1.6 }));
  return foundIn(kits.map((kit) => withToms(isSofter ? softened(kit) : kit)));
}

/** Sixteenths at 220 beats per minute on a damped drum. */
export function kicksInSixteenths(): KicksFound {
  return foundIn([smallKit({ kicks: 32, everyS: 60 / 220 / 4, bodyS: 0.04 })], 0.03);
}

function foundIn(kits: readonly SmallKit[], withinS = WITHIN_S): KicksFound {
  let [made, right, all] = [0, 0, 0];
  for (const kit of kits) {
    const { kickAt, sampleRateHz } = kit;
    const finder = createKickCandidates(sampleRateHz);
    eachLowBand(kit, (low) => finder.push(low));
    const at = selectKicks(finder.result(), sampleRateHz).map(({ atSample }) => atSample);
    const near = (start: number) => (sample: number) => Math.abs(sample - start) < withinS * sampleRateHz;
    made += kickAt.length;
    right += kickAt.filter((start) => at.some(near(start))).length;
    all += at.length;
  }
  return { precision: right / all, recall: right / made };
}

/** Toms of 85 Hz between the kicks, loud in the overhead and 10 dB under the kicks in their microphone. */
function withToms(kit: SmallKit): SmallKit {
  const [kick, overhead] = [kit.kick.slice(), kit.overhead.slice()];
  for (const at of kit.kickAt.map((start) => start + 12000)) {
    for (let i = 0; i < 12000 && at + i < kick.length; i += 1) {
      const tom = exp(-i / 5000) * sin((2 * PI * 85 * i) / kit.sampleRateHz);
      kick[at + i] += 0.12 * tom;
      overhead[at + i] += 0.5 * tom;
    }
  }
  return { ...kit, kick, overhead };
}

/** Kicks come every 24,000 samples, the first at 12,000. */
function softened(kit: SmallKit): SmallKit {
  const soften = (samples: Float32Array): Float32Array =>
    samples.map((value, i) => value * (Math.floor((i - 10800) / 24000) % 2 === 1 ? SOFTER : 1));
  return { ...kit, kick: soften(kit.kick), overhead: soften(kit.overhead) };
}
