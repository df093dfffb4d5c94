import {
  defaultUserSettings,
  type MeasurementResponse,
  type MeResponse,
  type ReportResponse,
  type TakeResponse,
  type TrackReport,
} from '@thudline/contracts';

/** Contract-valid answers for page tests: an invented take with a hot kick and an overhead to flip. */
export const takeId = '01890000-0000-7000-8000-000000000001';
const fileIds = ['01890000-0000-7000-8000-00000000000a', '01890000-0000-7000-8000-00000000000b'];

export const sampleMe: MeResponse = {
  id: '01890000-0000-7000-8000-0000000000ff',
  name: 'Juno',
  email: 'juno@example.org',
  emailVerified: true,
  roles: ['player'],
  settings: defaultUserSettings,
  readOnly: false,
  deleteAfter: null,
};

export const measurement = (overrides: Partial<MeasurementResponse> = {}): MeasurementResponse => ({
  state: 'done',
  stage: null,
  progress: 1,
  attempt: 1,
  reason: null,
  ...overrides,
});

export const sampleTake = (overrides: Partial<TakeResponse> = {}): TakeResponse => ({
  id: takeId,
  number: 14,
  title: '8 cm inside, again',
  note: 'Same groove as before.',
  recordedAt: '2026-12-02T19:40:00.000Z',
  createdAt: '2026-12-02T19:41:00.000Z',
  files: fileIds.map((id, i) => ({
    id,
    name: ['kick.wav', 'overhead.wav'][i],
    bytes: 2_304_044,
    sha256: 'ab'.repeat(32),
    encoding: '24-bit PCM',
    sampleRateHz: 48_000,
    channels: 1,
    durationS: 16,
    broadcast: null,
  })),
  tracks: [
    { role: 'kick', fileId: fileIds[0], channel: 0 },
    { role: 'overhead', fileId: fileIds[1], channel: 0 },
  ],
  measurement: measurement(),
  hasReport: true,
  sheetVersions: [{ version: '1', measuredAt: '2026-12-02T19:41:20.000Z' }],
  renewal: 'none',
  tickedActions: [],
  tags: [],
  follows: null,
  followedBy: null,
  room: null,
  setup: null,
  rights: { change: true, listen: true, download: true },
  player: 'Juno',
  ...overrides,
});

const track = (overrides: Partial<TrackReport>): TrackReport => ({
  samplePeakDbfs: -2.7,
  samplePeakAtS: 4.3,
  truePeakDbtp: -2.6,
  headroomDb: 2.7,
  rmsDbfs: -24.1,
  crestFactorDb: 21.4,
  integratedLufs: -23.8,
  clipping: { runs: [], runCount: 0, clippedSamples: 0 },
  looksFlattened: false,
  dropouts: { count: 0, firstAtS: null },
  dcOffset: 0.00002,
  noiseFloorDbfs: -71.2,
  noiseFloorReason: null,
  hum: null,
  loudestHitDbfs: -2.7,
  level: 'hot',
  gainChangeDb: -6.3,
  ...overrides,
});

const choice = (
  name: ReportResponse['agreement']['choices'][number]['name'],
  flipped: boolean,
  shiftMs: number,
  lowEndDb: number,
) => ({
  name,
  flipped,
  shiftMs,
  lowEndDb,
  deepest: { centreHz: 79.4, levelDb: -1.8 },
});

export const sampleReport = (overrides: Partial<ReportResponse> = {}): ReportResponse => ({
  version: 2,
  takeId,
  dspVersion: '1',
  measuredAt: '2026-12-02T19:41:20.000Z',
  sampleRateHz: 48_000,
  durationS: 16,
  target: defaultUserSettings.target,
  temperatureC: 20,
  kick: track({}),
  overhead: track({
    loudestHitDbfs: -8.4,
    samplePeakDbfs: -8.4,
    headroomDb: 8.4,
    level: 'on-target',
    gainChangeDb: -0.6,
  }),
  hits: [
    { timeS: 3.2, kind: 'kick', kickPeakDbfs: -6.1, overheadPeakDbfs: -14.2 },
    { timeS: 4.3, kind: 'kick', kickPeakDbfs: -2.7, overheadPeakDbfs: -12.9 },
    { timeS: 5.1, kind: 'drum', kickPeakDbfs: -30, overheadPeakDbfs: -8.4 },
    { timeS: 6.4, kind: 'kick', kickPeakDbfs: -5, overheadPeakDbfs: -13.4 },
  ],
  lateStart: null,
  arrival: {
    arrivalMs: 1.62,
    arrivalSamples: 77.8,
    arrivalIqrMs: 0.08,
    hitsUsed: 3,
    pathDifferenceM: 0.556,
    confidence: 0.93,
    firstSwing: { kick: 'up', overhead: 'down' },
    reason: null,
  },
  agreement: {
    lowCorrelation: -0.18,
    flipGainRecordedDb: 0.6,
    flipGainMatchedDb: 1.42,
    matchGainDb: 5.7,
    hitsUsed: 3,
    agreeingHits: 3,
    hitsAlike: 0.97,
    verdict: 'flip',
    sure: true,
    reason: null,
    bands: [{ lowHz: 30, highHz: 150, flipGainDb: 1.42 }],
    lowCut: { flipGainMatchedDb: -0.4, verdict: 'either-way' },
    contraryBands: [{ centreHz: 79.4, flipGainDb: -1.8 }],
    choices: [
      choice('as-recorded', false, 0, -0.72),
      choice('flipped', true, 0, 0.7),
      choice('shifted', false, 1.62, 0.46),
      choice('shifted-flipped', true, 1.62, -0.5),
    ],
  },
  balance: {
    drumsLufs: -29.8,
    cymbalsLufs: -25.2,
    differenceDb: 4.6,
    drumHits: 8,
    cymbalHits: 12,
    reason: null,
  },
  room: {
    snareHits: 8,
    decayS: 0.38,
    earlyS: 0.33,
    bands: [500, 1000, 2000, 4000].map((centreHz, i) => ({
      centreHz,
      t20S: { median: 0.42 - 0.04 * i, iqr: 0.01 },
      earlyS: { median: 0.34 - 0.02 * i, iqr: 0.02 },
      earlyToLateDb: { median: 9 + i, iqr: 0.4 },
    })),
    reason: null,
  },
  findings: [
    {
      topic: 'kick-level',
      status: 'watch',
      sentence: 'The hardest kick hit peaks at −2.7 dBFS.',
      why: 'Nothing clipped, but a hit 3 dB harder would.',
      next: 'Turn the kick preamp down 6.5 dB.',
    },
    {
      topic: 'overhead-level',
      status: 'good',
      sentence: 'The overhead is on target.',
      why: 'Its hardest hit peaks at −8.4 dBFS.',
      next: 'Leave it.',
    },
    {
      topic: 'adding-up',
      status: 'fix',
      sentence: 'Below 150 Hz the two microphones pull against each other.',
      why: 'All 3 kick hits say the same.',
      next: 'Flip the overhead; it can be done on this take.',
    },
    {
      topic: 'balance',
      status: 'watch',
      sentence: 'Cymbals are 5 dB louder than drums overhead.',
      why: 'One overhead holds both on a single track.',
      next: 'Play cymbals lighter.',
    },
    {
      topic: 'room',
      status: 'good',
      sentence: 'A loud snare dies away in 0.38 s here (60 dB).',
      why: 'It is for comparing takes of one snare in one room.',
      next: 'Note it.',
    },
  ],
  line: [
    { action: 'Flip the overhead:', reason: 'the kick gets 1.4 dB of its low end back.' },
    { action: 'Turn the kick down:', reason: 'a harder hit would clip.' },
  ],
  outcomes: [],
  actions: [
    {
      id: 'flip-overhead',
      action: 'Press the polarity switch',
      detail: 'on the overhead preamp.',
      leave: false,
    },
    {
      id: 'kick-gain',
      action: 'Turn the kick preamp down 6.5 dB.',
      detail: 'Your hardest hit should show about −9.',
      leave: false,
    },
    { id: 'overhead-gain-leave', action: 'Leave the overhead preamp where it is.', detail: '', leave: true },
  ],
  pairSpectrum: { binHz: 2.93, binCount: 4096, hitCount: 3 },
  ...overrides,
});

/** A made pair: equal energy everywhere, and a coherence of −0.3 below 200 Hz, so that a flip helps the low end. */
export function samplePairSpectrumBytes({
  binHz,
  binCount,
}: {
  binHz: number;
  binCount: number;
}): Uint8Array {
  const values = new Float32Array(binCount * 4);
  for (let i = 0; i < binCount; i++) {
    values[i] = 1;
    values[binCount + i] = 1;
    values[2 * binCount + i] = i * binHz < 200 ? -0.3 : 0;
  }
  return new Uint8Array(values.buffer);
}

/** One second of a decaying 60 Hz tone in both microphones, the overhead inverted. */
export function sampleExcerpt(): { bytes: Uint8Array; headers: Record<string, string> } {
  const frames = 48_000;
  const samples = new Float32Array(frames * 2);
  for (let i = 0; i < frames; i++) {
    const value =
      i < 2880 ? 0 : Math.sin((2 * Math.PI * 60 * (i - 2880)) / 48_000) * Math.exp(-(i - 2880) / 9600);
    samples[i] = 0.7 * value;
    samples[frames + i] = -0.3 * value;
  }
  return {
    bytes: new Uint8Array(samples.buffer),
    headers: {
      'X-Sample-Rate-Hz': '48000',
      'X-Frames': String(frames),
      'X-Start-Frame': '203520',
      'X-Tracks': '2',
    },
  };
}

/** Outlines of both tracks as the server sends them: a burst a second. */
export function samplePeaks(): { bytes: Uint8Array; headers: Record<string, string> } {
  const steps = 160;
  const values = new Int8Array(steps * 4);
  for (let i = 0; i < values.length; i += 2) {
    const size = Math.round(100 * Math.exp(-((i / 2) % 10) / 3));
    values[i] = -size;
    values[i + 1] = size;
  }
  return {
    bytes: new Uint8Array(values.buffer),
    headers: { 'X-Steps': String(steps), 'X-Tracks': '2', 'X-Duration-S': '16' },
  };
}
