import { delayedSamples } from '../../testing/delayedSamples';
import { createLowHops } from '../../testing/lowHops';
import { smallKit } from '../../testing/smallKit';
import { createKickCandidates } from '../hits/kickCandidates';
import { selectKicks } from '../hits/selectKicks';
import { createLateStart } from './lateStart';

const sampleRateHz = 48000;
const MS = sampleRateHz / 1000;
/** Kicks as uneven as a player's; the overhead hears them 2 ms later. */
const kit = smallKit({ kicks: 10, everyS: 0.47, delayMs: 2, hats: true, swingS: 0.06 });

const found = (kick: Float32Array, overhead: Float32Array, block = 9973) => {
  const candidates = createKickCandidates(sampleRateHz);
  const meter = createLateStart(sampleRateHz);
  const hops = createLowHops(sampleRateHz);
  for (let start = 0; start < kick.length; start += block) {
    const low = hops.push(kick.subarray(start, start + block), overhead.subarray(start, start + block));
    candidates.push(low);
    meter.push(low);
  }
  return meter.result(selectKicks(candidates.result(), sampleRateHz).length);
};
const lateMs = (ms: number) =>
  found(kit.kick, delayedSamples(kit.overhead, Math.round(ms * MS)))?.overheadLateMs ?? null;

describe('a file that starts late', () => {
  // Wanted (measurements.md, 4): offsets of 0.02–1.5 s within 5 ms. Of an overhead 2 ms away, so 18 and 22 come to 20 and 24.
  it.each([22, -30, 47, 95, -140, 233, 320, -470, 611, 780, -905, 1130, 1290, 1480])(
    'is found to run %i ms late',
    (ms) => {
      expect(Math.abs((lateMs(ms) ?? NaN) - ms)).toBeLessThan(5);
    },
  );

  it('is none where both start together, whatever the way of the sound', () => {
    expect([0, 1, 5, 10, 15, -15].map(lateMs)).toEqual(Array(6).fill(null));
  });

  it('is the same however the take is cut, whatever the levels and the polarity', () => {
    const overhead = delayedSamples(kit.overhead, 320 * MS);
    const whole = found(kit.kick, overhead);
    expect(found(kit.kick, overhead, 1009)).toEqual(whole);
    const other = found(
      kit.kick.map((x) => x / 64),
      overhead.map((x) => -x / 1024),
    );
    expect(other?.overheadLateMs).toBeCloseTo(whole?.overheadLateMs ?? NaN, 3);
  });

  it('is not told of silence, of one hit, and of noise', () => {
    const one = smallKit({ kicks: 1 });
    const noise = smallKit({ kicks: 0, noise: 0.01 });
    expect(found(one.kick, delayedSamples(one.overhead, 100 * MS))).toBeNull();
    expect(found(noise.kick, noise.overhead)).toBeNull();
    expect(found(kit.kick, new Float32Array(kit.kick.length))).toBeNull();
  });

  it('is not told of two passes of the same beat', () => {
    const other = smallKit({ kicks: 10, everyS: 0.53, seed: 9, hats: true, swingS: 0.06 });
    const length = Math.min(kit.kick.length, other.overhead.length);
    expect(found(kit.kick.subarray(0, length), other.overhead.subarray(0, length))).toBeNull();
  });
});
