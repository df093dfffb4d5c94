import type { ListTakesResponse, TakeListItem } from '@thudline/contracts';
import { measurement } from './sampleData';

/** Ids that are valid and differ by the take's number. */
export const listId = (number: number) => `01890000-0000-7000-8000-${String(number).padStart(12, '0')}`;

export const sampleListItem = (overrides: Partial<TakeListItem> = {}): TakeListItem => ({
  id: listId(overrides.number ?? 14),
  number: 14,
  title: '8 cm inside, again',
  recordedAt: '2026-11-30T19:40:00.000Z',
  measurement: measurement(),
  summary: { status: 'fix', strong: 'Flip the overhead.', rest: 'Turn the kick down 6.5 dB.' },
  kickPeakDbfs: -2.7,
  kickClipped: false,
  overheadPeakDbfs: -8.4,
  overheadClipped: false,
  lowEndDb: -0.7,
  tags: [],
  notes: 0,
  newNotes: 0,
  deletedAt: null,
  ...overrides,
});

export const sampleList = (
  items: TakeListItem[],
  overrides: Partial<Omit<ListTakesResponse, 'items'>> = {},
): ListTakesResponse => ({
  items,
  total: items.length,
  everyTotal: items.length,
  deletedTotal: 0,
  tags: [],
  setups: [],
  nextCursor: null,
  ...overrides,
});
