import { SignalError } from '../../assert';
import { delayedPair } from '../../testing/delayedPair';
import { smallKit } from '../../testing/smallKit';
import { flipGain } from './choiceLevels';
import { hitBalance } from './hitBalance';
import { lowCutResponse, withLowCut } from './lowCut';
import { createPairGatherer, pairTransformSize } from './pairSpectrum';
import { decodePairSpectrum, encodePairSpectrum } from './pairSpectrumBytes';

describe('the pair spectrum', () => {
  const kit = smallKit({ delayMs: 1.5 });
  const gather = (kick: Float32Array, overhead: Float32Array, toNext = 24000) => {
    const gatherer = createPairGatherer({ sampleRateHz: kit.sampleRateHz, perHit: hitBalance });
    for (const onsetAt of kit.kickAt) gatherer.add({ kick, overhead, onsetAt, toNext });
    return gatherer.result();
  };
  const pair = gather(kit.kick, kit.overhead);

  it('has bins of at most 3 Hz up to 12 kHz at every rate, in about 70 kB', () => {
    expect([44100, 48000].map(pairTransformSize)).toEqual([16384, 16384]);
    for (const rate of [8000, 22050, 32000, 88200, 96000, 192000, 384000]) {
      expect(rate / pairTransformSize(rate)).toBeLessThanOrEqual(3);
      expect(rate / pairTransformSize(rate)).toBeGreaterThan(1.5);
    }
    expect(pair?.skk).toHaveLength(4097);
    expect(encodePairSpectrum(pair ?? delayedPair()).byteLength).toBe(4 * 4097 * 4);
  });

  it('turns the cross spectrum round when the microphones are swapped', () => {
    const swapped = gather(kit.overhead, kit.kick);
    expect(swapped?.skk).toEqual(pair?.soo);
    expect(swapped?.skoRe).toEqual(pair?.skoRe);
    // 0 − x instead of −x: no negative zero.
    expect(swapped?.skoIm).toEqual(pair?.skoIm.map((value) => 0 - value));
  });

  it('keeps every comparison when both are scaled alike', () => {
    const half = gather(
      kit.kick.map((x) => x / 2),
      kit.overhead.map((x) => x / 2),
    );
    // Powers of two scale exactly.
    expect(flipGain(half ?? delayedPair(), { gainDb: 0 })).toBeCloseTo(
      flipGain(pair ?? delayedPair(), { gainDb: 0 }) ?? NaN,
      9,
    );
  });

  it('never holds more in common than there is', () => {
    const { skk, soo, skoRe, skoIm } = pair ?? delayedPair();
    // Cauchy and Schwarz; 0.1 %: float32 sums.
    const over = skk.filter(
      (power, i) => Math.hypot(skoRe[i], skoIm[i]) > 1.001 * Math.sqrt(power * soo[i]) + 1e-12,
    );
    expect(over).toHaveLength(0);
  });

  it('is null without a hit and takes a hit at the very edges of a file', () => {
    const empty = createPairGatherer({ sampleRateHz: 48000, perHit: hitBalance });
    expect(empty.result()).toBeNull();
    empty.add({ kick: Float32Array.of(1), overhead: Float32Array.of(1), onsetAt: 0, toNext: Infinity });
    expect([...(empty.result()?.skk ?? [])].every(Number.isFinite)).toBe(true);
  });
});

describe('a pair spectrum as bytes', () => {
  it('comes back as it was', () => {
    const pair = delayedPair({ delayMs: 1.2, gain: 0.4 });
    const bytes = encodePairSpectrum(pair);
    const shape = { binHz: pair.binHz, binCount: pair.skk.length, hitCount: pair.hitCount };
    expect(decodePairSpectrum(bytes, shape)).toEqual(pair);
    // Little-endian: the first value is 1.0.
    expect([...bytes.subarray(0, 4)]).toEqual([0, 0, 0x80, 0x3f]);
  });

  it('is refused where the length is wrong', () => {
    const shape = { binHz: 3, binCount: 10, hitCount: 1 };
    expect(() => decodePairSpectrum(new Uint8Array(159), shape)).toThrow(SignalError);
  });
});

describe('the low cut', () => {
  it('loses 3 dB at 80 Hz and 12 dB an octave below', () => {
    // |H|² = x⁴/(1 + x⁴), x = f/80 Hz: the closed form of a second-order Butterworth high pass.
    for (const hz of [20, 40, 80, 160, 1000]) {
      const { re, im } = lowCutResponse(hz);
      const x = (hz / 80) ** 4;
      expect(re * re + im * im).toBeCloseTo(x / (1 + x), 9);
    }
  });

  it('turns the phase by 90 degrees at 80 Hz', () => {
    const { re, im } = lowCutResponse(80);
    expect(re).toBeCloseTo(0, 9);
    expect(im).toBeGreaterThan(0);
  });

  it('leaves the kick microphone alone', () => {
    const pair = delayedPair();
    expect(withLowCut(pair).skk).toEqual(pair.skk);
    // One microphone and the same with the cut: Re(conj(H)) at 80 Hz is 0.
    const bin = Math.round(80 / pair.binHz);
    expect(Math.abs(withLowCut(pair).skoRe[bin])).toBeLessThan(0.05);
  });
});
