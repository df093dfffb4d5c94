import type {
  TryOutPlaceResponse,
  TryOutRankingResponse,
  TryOutRankingRow,
  TryOutResponse,
} from '@thudline/contracts';
import { measurement } from './sampleData';
import { listId } from './sampleList';

export const tryOutId = '01890000-0000-7000-8000-0000000000aa';
const placeId = (index: number) => `01890000-0000-7000-8000-0000000001${String(index).padStart(2, '0')}`;

export const samplePlace = (
  index: number,
  overrides: Partial<TryOutPlaceResponse> = {},
): TryOutPlaceResponse => ({
  id: placeId(index),
  uploadKey: `01890000-0000-4000-8000-0000000002${String(index).padStart(2, '0')}`,
  take: {
    id: listId(16 + index),
    number: 16 + index,
    title: '',
    recordedAt: '2026-12-04T19:40:00.000Z',
    measurement: measurement(),
    hasReport: true,
  },
  fileNames: [],
  position: 80 + 10 * index,
  label: '',
  ...overrides,
});

/** Five heights of the overhead; it stands at 90. */
export const sampleTryOut = (overrides: Partial<TryOutResponse> = {}): TryOutResponse => ({
  id: tryOutId,
  createdAt: '2026-12-04T20:10:00.000Z',
  subject: 'overhead-height',
  differs: '',
  unit: 'cm',
  reason: '',
  winnerPlaceId: null,
  currentPlaceId: placeId(1),
  winnerSetup: null,
  places: [0, 1, 2, 3, 4].map((index) => samplePlace(index)),
  ...overrides,
});

export const sampleRankingRow = (
  id: string,
  overrides: Partial<TryOutRankingRow> = {},
): TryOutRankingRow => ({
  placeId: id,
  value: 1.9,
  interval95: { low: 1.7, high: 2.1 },
  rank: 1,
  fromBest: 0,
  standing: 'best',
  word: 'fullest',
  reason: null,
  hits: 16,
  flipped: true,
  cymbalsOverDrumsDb: 2.4,
  heard: { firstKickS: 3.1, durationS: 12, sampleRateHz: 48_000, overheadGainDb: 5 },
  ...overrides,
});

const worse = (index: number, rank: number, value: number, cymbalsOverDrumsDb: number) =>
  sampleRankingRow(placeId(index), {
    rank,
    value,
    interval95: { low: value - 0.3, high: value + 0.3 },
    fromBest: value - 1.9,
    standing: 'worse',
    word: 'clearly thinner',
    cymbalsOverDrumsDb,
  });

/** 100 cm is fullest, 110 as good as far as can be told. */
export const sampleRanking = (overrides: Partial<TryOutRankingResponse> = {}): TryOutRankingResponse => ({
  measure: 'low-end',
  polarity: 'best-polarity',
  also: null,
  unit: 'dB',
  step: 0.5,
  higherIsBetter: true,
  rows: [
    sampleRankingRow(placeId(2)),
    sampleRankingRow(placeId(3), {
      rank: 2,
      value: 1.7,
      interval95: { low: 1.45, high: 1.95 },
      fromBest: -0.2,
      standing: 'as-good',
      word: 'no clear difference',
      cymbalsOverDrumsDb: 2,
    }),
    worse(1, 3, 1.1, 3.2),
    worse(4, 4, 0.8, 1.8),
    worse(0, 5, 0.4, 4.1),
  ],
  ...overrides,
});
