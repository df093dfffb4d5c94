import { createSpanCutter, everySamples, largestOfSpan } from './spans';

const wave = Float32Array.from({ length: 5000 }, (_, i) => Math.sin(i) * (1 + (i % 700)));
/** Copies of what a cutter says of blocks of `size`; `end` counts from the first block's start. */
function cutInto(size: number, every: number) {
  const cutter = createSpanCutter([everySamples(every)]);
  const found: { end: number; largest: number; sum: number; energy: number }[] = [];
  for (let start = 0; start < wave.length; start += size) {
    const spans = cutter.cut(wave.subarray(start, start + size));
    for (let i = 0; i < spans.count; i += 1) {
      const [sum, energy] = [spans.sums[i], spans.energies[i]];
      found.push({ end: start + spans.ends[i], largest: largestOfSpan(spans, i), sum, energy });
    }
  }
  return found;
}

describe('spans', () => {
  it.each([
    [5000, 300],
    [777, 300],
    [1, 300],
    [5000, 4999],
  ])('of blocks of %i cover all samples and cross no border every %i', (size, every) => {
    let from = 0;
    for (const { end, largest, sum, energy } of cutInto(size, every)) {
      const samples = [...wave.subarray(from, end)];
      expect(samples.length).toBeGreaterThan(0);
      expect(Math.floor(from / every)).toBe(Math.floor((end - 1) / every));
      expect(largest).toBe(Math.max(...samples.map(Math.abs)));
      expect(sum).toBeCloseTo(
        samples.reduce((all, x) => all + x, 0),
        6,
      );
      expect(energy).toBeCloseTo(
        samples.reduce((all, x) => all + x * x, 0),
        4,
      );
      from = end;
    }
    expect(from).toBe(wave.length);
  });

  it('have an energy that is no number where a sample is none', () => {
    const spans = createSpanCutter([]).cut(Float32Array.of(1, Number.NaN, 1));
    expect(spans.energies[0]).toBeNaN();
  });
});
