import type { ListRoomChangesResponse, RoomChangeResponse, RoomResponse } from '@thudline/contracts';

export const roomId = '01890000-0000-7000-8000-0000000000aa';
const changeId = (number: number) => `01890000-0000-7000-8000-0000000001${String(number).padStart(2, '0')}`;
export const roomTakeId = (number: number) =>
  `01890000-0000-7000-8000-0000000002${String(number).padStart(2, '0')}`;

/** Contract-valid answers for page tests: an invented garage. */
export const sampleRoom = (overrides: Partial<RoomResponse> = {}): RoomResponse => ({
  id: roomId,
  name: 'The garage',
  createdAt: '2026-10-01T10:00:00.000Z',
  shape: { kind: 'box', lengthM: 5.2, widthM: 3.1, heightM: 2.4 },
  surfaces: [{ place: 'floor', materialId: 'concrete-floor', areaM2: null }],
  temperatureC: 12,
  kit: { xM: 3, yM: 1.6, turnedDeg: 15 },
  takeCount: 15,
  firstTakeAt: '2026-10-05T19:40:00.000Z',
  lastTakeAt: '2026-12-01T19:40:00.000Z',
  changeCount: 2,
  photo: null,
  ...overrides,
});

const takeOf = (number: number) => ({ id: roomTakeId(number), number, title: '' });

export const sampleChange = (overrides: Partial<RoomChangeResponse> = {}): RoomChangeResponse => ({
  id: changeId(overrides.number ?? 2),
  number: 2,
  happenedOn: '2026-11-30',
  rank: 0,
  what: 'Moving blankets on the back wall',
  category: 'soft-material',
  place: { xM: 5, yM: 1.5 },
  cost: '30 spent',
  note: '',
  before: [takeOf(7)],
  after: [takeOf(8), takeOf(9)],
  isTold: true,
  caveats: [],
  photo: null,
  did: {
    status: 'good',
    strong: 'A snare dies 0.11 s sooner at 500 Hz.',
    rest: 'Sure: 22 hits before, 41 after.',
  },
  figures: [
    {
      key: 'decay-500',
      unit: 's',
      before: 0.6,
      after: 0.49,
      change: -0.183,
      interval95: { low: -0.24, high: -0.13 },
      step: { kind: 'share', size: 0.1 },
      clear: true,
      word: 'shorter',
      hitsBefore: 22,
      hitsAfter: 41,
    },
    {
      key: 'noise-overhead',
      unit: 'dBFS',
      before: -61,
      after: -60.6,
      change: 0.4,
      interval95: null,
      step: { kind: 'difference', size: 2 },
      clear: false,
      word: null,
      hitsBefore: null,
      hitsAfter: null,
    },
  ],
  ...overrides,
});

export const openChange = sampleChange({
  number: 1,
  happenedOn: '2026-10-19',
  what: 'Kit moved to the middle',
  category: 'placement',
  cost: '',
  place: null,
  before: [takeOf(1)],
  after: [],
  did: {
    status: 'cannot-tell',
    strong: 'No take since then.',
    rest: 'Record one the way you recorded take 1, and it shows here.',
  },
  figures: [],
});

export const sampleLog = (
  items: RoomChangeResponse[] = [sampleChange(), openChange],
): ListRoomChangesResponse => ({
  items,
  takes: [9, 8, 7, 1].map((number, i) => ({
    ...takeOf(number),
    recordedAt: ['2026-12-01', '2026-11-30', '2026-11-20', '2026-10-05'][i] + 'T19:40:00.000Z',
  })),
});
