import { paths, type ComparedFigure, type ComparisonResponse } from '@thudline/contracts';
import { json, type FakeRoutes } from './fakeServer';
import { sampleExcerpt, sampleMe, samplePairSpectrumBytes, sampleReport, takeId } from './sampleData';
import { listId, sampleList, sampleListItem } from './sampleList';

export const beforeId = takeId;
export const afterId = listId(15);

const figure = (overrides: Partial<ComparedFigure>): ComparedFigure => ({
  key: 'low-end',
  label: 'low end, added up',
  unit: 'dB',
  decimals: 1,
  before: -0.7,
  after: 0.6,
  change: 1.3,
  interval95: { low: 1.1, high: 1.5 },
  step: 0.5,
  isShare: false,
  clear: true,
  reason: null,
  hitsBefore: 20,
  hitsAfter: 21,
  word: 'fuller',
  ...overrides,
});

export const sampleComparison = (overrides: Partial<ComparisonResponse> = {}): ComparisonResponse => ({
  before: {
    id: beforeId,
    number: 14,
    title: '8 cm inside, again',
    recordedAt: '2026-12-02T19:40:00.000Z',
    canListen: true,
  },
  after: {
    id: afterId,
    number: 15,
    title: 'flipped, 8 cm inside',
    recordedAt: '2026-12-02T19:52:00.000Z',
    canListen: true,
  },
  line: [
    { action: 'The flip worked:', reason: '1.3 dB of low end came back; we expected 1.4.' },
    { action: 'Leave the kick preamp', reason: 'there.' },
  ],
  differed: [
    { what: 'overhead polarity', before: 'not pressed', after: 'pressed' },
    { what: 'done in between', before: '', after: 'kick preamp turned' },
  ],
  same: 'Positions are the same.',
  polarity: {
    noted: true,
    seen: 'flipped',
    confirmed: true,
    sentence:
      'You noted a flip, and the sound confirms it: the low end turned over in 21 of 21 hits. It was to reach 0.7 dB and reached 0.6.',
    beforeDb: -0.7,
    afterDb: 0.6,
    expectedDb: 0.7,
  },
  findings: sampleReport().findings.map((finding) => ({
    topic: finding.topic,
    before: finding,
    after: { ...finding, status: 'good' as const, sentence: 'All is well there; leave it.' },
  })),
  figures: [
    figure({}),
    figure({
      key: 'hardest-kick',
      label: 'hardest kick hit',
      unit: 'dBFS',
      before: -2.7,
      after: -8.9,
      change: -6.2,
      interval95: null,
      step: 1,
      hitsBefore: null,
      hitsAfter: null,
      word: 'lower',
    }),
    figure({
      key: 'decay-500',
      label: 'decay, 500 Hz',
      unit: 's',
      decimals: 2,
      before: 0.42,
      after: 0.43,
      change: 0.03,
      interval95: { low: -0.04, high: 0.08 },
      step: 0.1,
      isShare: true,
      clear: false,
      word: null,
    }),
    figure({
      key: 'attack',
      label: 'attack',
      before: null,
      after: null,
      change: null,
      interval95: null,
      step: 1,
      clear: false,
      reason: 'strength-unmatched',
      word: null,
    }),
  ],
  caveats: [{ about: 'matching', text: 'A preamp changed, so hits can’t be matched by strength.' }],
  ...overrides,
});

const reportAfter = sampleReport({
  takeId: afterId,
  kick: { ...sampleReport().kick, level: 'on-target', loudestHitDbfs: -8.9 },
  agreement: { ...sampleReport().agreement, verdict: 'keep' },
});

/** Everything that a comparison asks for, answered. */
export function servedComparison(comparison: Partial<ComparisonResponse> = {}): FakeRoutes {
  const spectrum = () => ({ bytes: samplePairSpectrumBytes(reportAfter.pairSpectrum!) });
  const takes = [
    sampleListItem({ id: afterId, number: 15, title: 'flipped, 8 cm inside' }),
    sampleListItem({ id: beforeId, number: 14 }),
    sampleListItem({ number: 13, title: '5 cm inside' }),
  ];
  return {
    [`GET ${paths.me}`]: json(sampleMe),
    [`GET ${paths.takes}`]: json(sampleList(takes)),
    [`GET ${paths.comparison(beforeId, afterId)}`]: json(sampleComparison(comparison)),
    [`GET ${paths.report(beforeId)}`]: json(sampleReport()),
    [`GET ${paths.report(afterId)}`]: json(reportAfter),
    [`GET ${paths.pairSpectrum(beforeId)}`]: spectrum,
    [`GET ${paths.pairSpectrum(afterId)}`]: spectrum,
    [`GET ${paths.excerpt(beforeId)}`]: () => sampleExcerpt(),
    [`GET ${paths.excerpt(afterId)}`]: () => sampleExcerpt(),
  };
}
