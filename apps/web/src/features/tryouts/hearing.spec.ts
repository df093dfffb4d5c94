import { sampleRankingRow, sampleTryOut } from '../../testing/sampleTryOut';
import { heardPlaces, shuffled } from './hearing';

describe('hearing the takes of a try-out', () => {
  it('begins each as far before its first kick and hears each as long, in the order they were played', () => {
    const tryOut = sampleTryOut();
    const rows = [
      sampleRankingRow(tryOut.places[1].id, {
        flipped: true,
        heard: { firstKickS: 0.05, durationS: 9, sampleRateHz: 44_100, overheadGainDb: 3 },
      }),
      sampleRankingRow(tryOut.places[0].id, {
        flipped: false,
        heard: { firstKickS: 3.2, durationS: 60, sampleRateHz: 48_000, overheadGainDb: 4.5 },
      }),
    ];
    expect(heardPlaces(tryOut, rows)).toEqual([
      expect.objectContaining({ placeId: tryOut.places[0].id, flipped: false }),
      expect.objectContaining({ placeId: tryOut.places[1].id, flipped: true }),
    ]);
    const [late, early] = heardPlaces(tryOut, rows);
    expect(early).toMatchObject({ startS: 0, endS: 9 });
    // As long before its first kick as the other has room for, and as long as the other lasts.
    expect(late.startS).toBeCloseTo(3.15, 9);
    expect(late.endS).toBeCloseTo(12.15, 9);
  });

  it('leaves out what isn’t measured', () => {
    expect(heardPlaces(sampleTryOut(), [])).toEqual([]);
  });

  it('shuffles without losing any, and leaves the list alone', () => {
    const items = [1, 2, 3, 4, 5];
    const mixed = shuffled(items, () => 0);
    expect(mixed).not.toEqual(items);
    expect([...mixed].sort()).toEqual([1, 2, 3, 4, 5]);
    expect(items).toEqual([1, 2, 3, 4, 5]);
  });
});
