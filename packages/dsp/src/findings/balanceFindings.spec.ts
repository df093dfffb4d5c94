import type { BalanceReport } from '../report/reportTypes';
import { reportOf } from '../testing/figures';
import { balanceFindings } from './balanceFindings';

const balance = (differenceDb: number | null, change: Partial<BalanceReport> = {}): BalanceReport => ({
  drumsLufs: -30,
  cymbalsLufs: differenceDb === null ? null : -30 + differenceDb,
  differenceDb,
  drumHits: 8,
  cymbalHits: 12,
  reason: differenceDb === null ? 'too-few-cymbals' : null,
  ...change,
});
const told = (figures: BalanceReport | null) => balanceFindings(reportOf({ balance: figures }));

describe('the finding about drums and cymbals', () => {
  it.each([
    [
      5.2,
      'watch',
      'Cymbals are 5 dB louder than drums overhead, which no fader fixes later; play them lighter or raise the microphone a little.',
    ],
    [
      3,
      'good',
      'Cymbals are 3 dB louder than drums in the overhead, so the two sit together; leave the microphone where it is.',
    ],
    [
      0.4,
      'good',
      'Cymbals are about as loud as drums in the overhead, so the two sit together; leave the microphone where it is.',
    ],
    [
      -13.8,
      'good',
      'Cymbals are 14 dB quieter than drums in the overhead, so they drown nothing; leave the microphone where it is.',
    ],
  ])('%d dB is %s', (differenceDb, status, sentence) => {
    expect(told(balance(differenceDb))).toMatchObject([{ topic: 'balance', status, sentence }]);
    expect(sentence.split(/\s+/).length).toBeLessThanOrEqual(25);
  });

  it('says which hits are missing', () => {
    const [finding] = told(balance(null, { drumHits: 8, cymbalHits: 1 }));
    expect(finding).toMatchObject({
      status: 'cannot-tell',
      sentence:
        'Can’t tell cymbals against drums: eight drum hits and one cymbal hit stand alone; play five of each with nothing else.',
    });
    expect(finding.sentence.split(/\s+/).length).toBeLessThanOrEqual(25);
  });

  it('says nothing of a take that was measured before this was', () => {
    expect(told(null)).toEqual([]);
  });
});
