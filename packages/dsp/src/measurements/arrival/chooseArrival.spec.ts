import { chooseArrival, type ArrivalEvidence } from './chooseArrival';

const first = { medianMs: 1.6, iqrMs: 0.1, hits: 8, repeats: 0.9 };
const evidence = (
  change: Partial<ArrivalEvidence> = {},
  peaks: [number, number][] = [[5, 0.3]],
): ArrivalEvidence => ({
  hits: 8,
  overheadSounds: true,
  first,
  phase: {
    peaks: () => peaks.map(([lagMs, height]) => ({ lagMs, height })),
    lagsPerHit: (lagMs) => [lagMs, lagMs, lagMs],
  },
  ...change,
});

describe('the choice of an arrival', () => {
  it('is the first arrivals where no peak is high, as on real kits', () => {
    expect(chooseArrival(evidence())).toMatchObject({
      arrivalMs: 1.6,
      arrivalIqrMs: 0.1,
      hitsUsed: 8,
      reason: null,
    });
  });

  it('is surer where a peak agrees', () => {
    const alone = chooseArrival(evidence()).confidence;
    expect(chooseArrival(evidence({}, [[1.7, -0.4]])).confidence).toBeGreaterThan(alone);
    expect(alone).toBeGreaterThan(0.5);
  });

  it('is a high peak, also where a hat came first', () => {
    expect(chooseArrival(evidence({}, [[3, 0.8]])).arrivalMs).toBe(3);
  });

  it('takes of two peaks nearly as high the one near the first arrivals', () => {
    expect(
      chooseArrival(
        evidence({}, [
          [6.5, 0.8],
          [1.5, 0.75],
        ]),
      ).arrivalMs,
    ).toBe(1.5);
    expect(
      chooseArrival(
        evidence({}, [
          [2.5, 0.8],
          [1.5, 0.6],
        ]),
      ).arrivalMs,
    ).toBe(2.5);
  });

  it('is null with a reason rather than a wild number', () => {
    const reason = (change: Partial<ArrivalEvidence>, peaks?: [number, number][]) => {
      const { arrivalMs, confidence, reason: why } = chooseArrival(evidence(change, peaks));
      expect([arrivalMs, confidence]).toEqual([null, 0]);
      return why;
    };
    const none = { medianMs: null, iqrMs: null, hits: 0, repeats: null };
    expect(reason({ hits: 0, first: none })).toBe('no-kick-hits');
    expect(reason({ overheadSounds: false, first: none })).toBe('overhead-silent');
    expect(reason({ first: none })).toBe('too-few-hits');
    expect(reason({ first: { ...first, medianMs: 3, iqrMs: 1.2 } })).toBe('hits-disagree');
    expect(reason({ first: { ...first, medianMs: 9 } }, [[2, 0.8]])).toBe('methods-disagree');
  });

  it('is surest where the highest peak is the one next to the first arrivals', () => {
    const sure = (...peaks: [number, number][]) => chooseArrival(evidence({}, peaks)).confidence;
    expect(sure([1.5, 0.8])).toBe(1);
    expect(sure([1.7, 0.46], [1.2, 0.44])).toBe(1);
    expect(sure([2.5, 0.8], [1.5, 0.75])).toBeLessThan(0.7);
    // A weak peak nearby may be chance, as may be the second of several.
    expect(sure([1.6, 0.3])).toBeLessThan(0.7);
    expect(sure([5, 0.4], [1.6, 0.38])).toBeLessThan(0.7);
  });

  it('is not confident where what is heard first is new noise at every hit, as under hats', () => {
    const hat = { first: { ...first, repeats: 0.3 } };
    expect(chooseArrival(evidence(hat))).toMatchObject({ arrivalMs: 1.6 });
    expect(chooseArrival(evidence(hat)).confidence).toBeLessThan(0.5);
    // A high peak doesn't need the first arrivals.
    expect(chooseArrival(evidence(hat, [[3, 0.8]])).confidence).toBeGreaterThan(0.5);
  });

  it('is not confident in a peak that is contradicted and low, or comes before the kick itself', () => {
    expect(chooseArrival(evidence({}, [[3, 0.55]])).confidence).toBeLessThan(0.5);
    expect(chooseArrival(evidence({}, [[-2, 0.9]])).confidence).toBeLessThan(0.5);
    expect(
      chooseArrival(evidence({ first: { ...first, medianMs: -2 } }, [[-2, 0.9]])).confidence,
    ).toBeGreaterThan(0.7);
  });

  it('is not confident on one hit', () => {
    const one = chooseArrival(
      evidence({ hits: 1, first: { medianMs: 1.6, iqrMs: null, hits: 1, repeats: null } }),
    );
    expect(one.arrivalMs).toBe(1.6);
    expect(one.confidence).toBeLessThan(0.5);
  });
});
