import { panned, ticksMs, zoomed } from './traceView';

const low = { fromMs: -6, toMs: 44 };

describe('the view of the pair trace', () => {
  it('zooms about the time under the pointer', () => {
    const closer = zoomed(low, { atMs: 4, factor: 0.5 });
    expect(closer).toEqual({ fromMs: -1, toMs: 24 });
    expect(zoomed(closer, { atMs: 4, factor: 2 })).toEqual(low);
  });

  it('stops where nothing more can be seen', () => {
    expect(
      zoomed(low, { atMs: 0, factor: 1e-6 }).toMs - zoomed(low, { atMs: 0, factor: 1e-6 }).fromMs,
    ).toBeCloseTo(2, 9);
    expect(zoomed(low, { atMs: 0, factor: 1e6 })).toEqual({ fromMs: -50, toMs: 600 });
  });

  it('moves no further than there is sound, keeping its span', () => {
    expect(panned(low, -1000)).toEqual({ fromMs: -50, toMs: 0 });
    expect(panned(low, 1000)).toEqual({ fromMs: 550, toMs: 600 });
    expect(panned(low, 10)).toEqual({ fromMs: 4, toMs: 54 });
  });

  it('writes round times', () => {
    expect(ticksMs(low, 5)).toEqual([0, 10, 20, 30, 40]);
    expect(ticksMs({ fromMs: 1, toMs: 3 }, 5)).toEqual([1.5, 2, 2.5]);
  });
});
