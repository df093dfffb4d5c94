import { emptySetup, type SetupListItem, type SetupResponse } from '@thudline/contracts';

/** A setup whose numbers say 96 cm, and a take that measured 93. */
export const sampleSetup = (overrides: Partial<SetupResponse> = {}): SetupResponse => ({
  ...emptySetup,
  id: '01890000-0000-7000-8000-000000000051',
  name: 'one overhead, high',
  kick: { insideCm: 8, offCentreCm: 4, heightCm: 28, turnedDeg: 0, which: 'a dynamic, on a short stand' },
  overhead: {
    aboveSnareCm: 90,
    towardKickCm: 9,
    awayFromHatCm: 8,
    tiltedDeg: 10,
    which: 'a small condenser',
  },
  kickPreamp: { ...emptySetup.kickPreamp, gainDb: 31.5, pad: true },
  overheadPreamp: { ...emptySetup.overheadPreamp, gainDb: 44, polarity: true, phantom: true },
  rest: 'blanket in the drum, felt beater',
  createdAt: '2026-11-01T10:00:00.000Z',
  copiedFrom: { id: '01890000-0000-7000-8000-000000000050', name: '8 cm inside' },
  photo: null,
  takeCount: 1,
  takes: [{ id: '01890000-0000-7000-8000-000000000017', number: 17 }],
  measured: {
    takeId: '01890000-0000-7000-8000-000000000017',
    number: 17,
    arrivalMs: 2.7,
    arrivalIqrMs: 0.1,
  },
  ...overrides,
});

export const sampleSetupItem = (overrides: Partial<SetupListItem> = {}): SetupListItem => {
  const { id, name, kick, overhead, createdAt, takeCount } = sampleSetup();
  return {
    id,
    name,
    kick,
    overhead,
    createdAt,
    takeCount,
    lastUsedAt: '2026-11-20T19:40:00.000Z',
    ...overrides,
  };
};
