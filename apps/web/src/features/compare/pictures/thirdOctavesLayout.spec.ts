import { bandPairs, bandPath, largestMove } from './thirdOctavesLayout';

const bins = 4096;
/** Equal energy everywhere; below 200 Hz the two agree by `coherence`. */
function spectrum(coherence: number) {
  const binHz = 2.93;
  const ones = new Float32Array(bins).fill(1);
  const skoRe = Float32Array.from({ length: bins }, (_, i) => (i * binHz < 200 ? coherence : 0));
  return {
    spectrum: { binHz, hitCount: 8, skk: ones, soo: ones, skoRe, skoIm: new Float32Array(bins) },
    overheadGainDb: 0,
  };
}

describe('third-octaves of two takes', () => {
  it('stand as far above nothing after a flip as below it before', () => {
    const bands = bandPairs(spectrum(-0.3), spectrum(0.3));
    const low = bands.find(({ nominal }) => nominal === '63')!;
    expect(low.beforeDb).toBeCloseTo(10 * Math.log10(0.7), 2);
    expect(low.afterDb).toBeCloseTo(10 * Math.log10(1.3), 2);
    expect(bands.find(({ nominal }) => nominal === '1k')!.afterDb).toBeCloseTo(0, 6);
    expect(largestMove(bands)!.byDb).toBeCloseTo(10 * Math.log10(1.3 / 0.7), 2);
  });

  it('are one line, broken where there is nothing', () => {
    const at = { x: (i: number) => i, y: (db: number) => db };
    expect(bandPath([1, 2, null, 3], at)).toBe('M0.0 1.0L1.0 2.0M3.0 3.0');
    expect(largestMove([{ nominal: '63', centreHz: 63, beforeDb: null, afterDb: 1 }])).toBeNull();
  });
});
