import { broadcastWords } from './broadcastWords';

const nothing = { description: null, originator: null, date: null, time: null, timeReferenceSamples: null };

describe('what a recorder wrote into a file', () => {
  it('is told in one line', () => {
    expect(
      broadcastWords({
        description: 'Take 4',
        originator: 'Field recorder',
        date: '2026-11-30',
        time: '18:05:09',
        timeReferenceSamples: 4_665_600_000,
      }),
    ).toBe(
      'In the file: “Take 4”, by Field recorder, recorded 2026-11-30 at 18:05:09 by its clock, begins 4,665,600,000 samples after midnight.',
    );
  });
  it('leaves out what isn’t there', () => {
    expect(broadcastWords({ ...nothing, date: '2026-11-30', timeReferenceSamples: 0 })).toBe(
      'In the file: recorded 2026-11-30 by its clock.',
    );
  });
});
