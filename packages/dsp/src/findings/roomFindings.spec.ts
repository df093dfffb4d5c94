import type { RoomReport } from '../report/reportTypes';
import { reportOf } from '../testing/figures';
import { roomFindings } from './roomFindings';

const room = (change: Partial<RoomReport> = {}): RoomReport => ({
  snareHits: 8,
  decayS: 0.385,
  earlyS: 0.33,
  bands: [],
  reason: null,
  ...change,
});
const told = (figures: RoomReport | null) => roomFindings(reportOf({ room: figures }));
const none = { decayS: null, earlyS: null };

describe('the finding about the room', () => {
  it.each([
    [
      room(),
      'good',
      'A loud snare dies away in 0.39 s here (60 dB), the early part in 0.33; compare it with other takes of this snare.',
    ],
    [
      room({ earlyS: null }),
      'good',
      'A loud snare dies away in 0.39 s here (60 dB); compare it with other takes of this snare.',
    ],
    [
      room({ ...none, snareHits: 1, reason: 'too-few-snares' }),
      'cannot-tell',
      'Can’t tell how the room dies away: one loud snare hit stands alone; play six hard snare hits with two seconds between.',
    ],
    [
      room({ ...none, snareHits: 0, reason: 'too-few-snares' }),
      'cannot-tell',
      'Can’t tell how the room dies away: no loud snare hits stand alone; play six hard snare hits with two seconds between.',
    ],
    [
      room({ ...none, reason: 'cut-short' }),
      'cannot-tell',
      'Can’t tell how the room dies away: hits follow too soon or noise hides it; play six hard snare hits with two seconds between.',
    ],
  ] as const)('%#', (figures, status, sentence) => {
    expect(told(figures)).toMatchObject([{ topic: 'room', status, sentence }]);
    expect(sentence.split(/\s+/).length).toBeLessThanOrEqual(25);
  });

  it('is never more than a figure to compare by, and says so', () => {
    expect(told(room())[0].why).toContain('no standard room measurement');
  });

  it('says nothing of a take that was measured before this was', () => {
    expect(told(null)).toEqual([]);
  });
});
