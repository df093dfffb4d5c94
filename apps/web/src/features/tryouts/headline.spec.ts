import type { TryOutRankingResponse, TryOutResponse } from '@thudline/contracts';
import { measurement } from '../../testing/sampleData';
import { samplePlace, sampleRanking, sampleRankingRow, sampleTryOut } from '../../testing/sampleTryOut';
import { headline } from './headline';

const told = (
  tryOut: Partial<TryOutResponse> = {},
  ranking: Partial<TryOutRankingResponse> = {},
  lengthUnit: 'metre' | 'foot' = 'metre',
) => {
  const { strong, rest } = headline({
    tryOut: sampleTryOut(tryOut),
    ranking: sampleRanking(ranking),
    lengthUnit,
  });
  return `${strong} ${rest}`;
};
const ids = sampleTryOut().places.map(({ id }) => id);

describe('the line of a try-out', () => {
  it('says where to go, what that brings and what may be as good', () => {
    expect(told()).toBe(
      'Raise the overhead to 100 cm: the kick gets 0.8 dB fuller than now. 110 may be as good.',
    );
    expect(told({}, {}, 'foot')).toBe(
      'Raise the overhead to 39.4 in: the kick gets 0.8 dB fuller than now. 43.3 may be as good.',
    );
    expect(told({ currentPlaceId: ids[4] })).toMatch(/^Lower the overhead to 100 cm: the kick gets 1\.1 dB/);
  });

  it('says so where it isn’t known what stands now', () => {
    expect(told({ currentPlaceId: null })).toBe(
      'Hang the overhead at 100 cm: fullest, +1.9 dB. 110 may be as good.',
    );
  });

  it('leaves well alone what is best, or as good as it', () => {
    expect(told({ currentPlaceId: ids[2] })).toBe(
      'Leave the overhead at 100 cm: nothing else is fuller. 110 may be as good.',
    );
    expect(told({ currentPlaceId: ids[3] })).toBe(
      'Leave the overhead at 110 cm: 100 reads 0.2 dB fuller, which may be chance.',
    );
  });

  it('speaks of labels where there are no numbers, and of another measure in its words', () => {
    const places = ['felt', 'wood'].map((label, i) => samplePlace(i, { label, position: null }));
    const rows = [
      sampleRankingRow(ids[1], { value: -3.1, word: 'most attack' }),
      sampleRankingRow(ids[0], { value: -7.3, fromBest: -4.2, standing: 'worse', rank: 2 }),
    ];
    const beaters = {
      subject: 'other',
      differs: 'the beater',
      unit: 'label',
      places,
      currentPlaceId: ids[0],
    } as const;
    expect(told(beaters, { measure: 'attack', rows })).toBe(
      'Take wood: the kick gets 4.2 dB more click than now.',
    );
  });

  it('can’t tell without hits, and says what would settle it', () => {
    const unsure = { rank: null, standing: null, fromBest: null, word: null } as const;
    const rows = ids.map((id) => sampleRankingRow(id, { ...unsure, reason: 'too-few-hits' }));
    expect(told({}, { rows })).toBe(
      'Can’t tell which is best: 5 takes have too few hits. Play at least six kicks and six other drums at each position.',
    );
    const measuring = samplePlace(0);
    const take = { ...measuring.take!, hasReport: false, measurement: measurement({ state: 'running' }) };
    expect(told({ places: [{ ...measuring, take }] }, { rows: [] })).toMatch(
      /^The takes are being measured\./,
    );
    expect(told({ places: [] }, { rows: [] })).toMatch(/^Nothing to rank yet\./);
  });
});
