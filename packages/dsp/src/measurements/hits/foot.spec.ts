import { randomNumbers } from '../../testing/randomNumbers';
import { smallKit } from '../../testing/smallKit';
import { foot } from './foot';

const sampleRateHz = 48000;
const MS = sampleRateHz / 1000;

describe('where a hit is first heard', () => {
  const { kick, kickAt } = smallKit({ kicks: 6, noise: 1e-3 });
  // The filter and the threshold of a tenth of the peak: seen 0.1 ms after the first sound, given half a millisecond.
  const WITHIN = 0.5 * MS;

  it.each([1, 3, 8])('is found %s ms before the onset it was asked from', (ms) => {
    for (const at of kickAt) {
      expect(Math.abs(foot(kick, { sampleRateHz, onsetAt: at + ms * MS }) - at)).toBeLessThan(WITHIN);
    }
  });

  it('is the same however loud the hit and whichever its polarity', () => {
    const [at] = kickAt;
    const asked = { sampleRateHz, onsetAt: at + 3 * MS };
    for (const gain of [-1, 0.01]) {
      expect(
        foot(
          kick.map((x) => gain * x),
          asked,
        ),
      ).toBe(foot(kick, asked));
    }
  });

  it('is the onset itself where nothing rises before it, and in silence', () => {
    const random = randomNumbers(4);
    const steady = Float32Array.from({ length: 9600 }, random);
    expect(foot(steady, { sampleRateHz, onsetAt: 4800 })).toBe(4800);
    expect(foot(new Float32Array(9600), { sampleRateHz, onsetAt: 4800 })).toBe(4800);
  });

  it('is never before the beginning of a take that begins with a hit', () => {
    const at = kickAt[0];
    const found = foot(kick.subarray(at), { sampleRateHz, onsetAt: 3 * MS });
    expect(found).toBeGreaterThanOrEqual(0);
    expect(found).toBeLessThan(WITHIN);
  });
});
