import { recordedAt, type RecordedFile } from './recordedAt';

const nowMs = Date.UTC(2026, 11, 1, 20);
const day = 24 * 60 * 60 * 1000;
const iso = (ms: number) => new Date(ms).toISOString();
const file = (lastModified: number, clock?: [date: string | null, time: string | null]): RecordedFile => ({
  lastModified,
  broadcast: clock ? { date: clock[0], time: clock[1] } : null,
});

describe('when a take was recorded', () => {
  it('is when the later of its files was written', () => {
    expect(recordedAt([file(nowMs - 2 * day), file(nowMs - day)], nowMs)).toBe(iso(nowMs - day));
  });
  it('is now when the files are older than a month', () => {
    expect(recordedAt([file(nowMs - 31 * day)], nowMs)).toBe(iso(nowMs));
  });
  it('is now when the files claim to be from the future', () => {
    expect(recordedAt([file(nowMs + 1000)], nowMs)).toBe(iso(nowMs));
  });

  it('is what the recorder’s clock said, here, whenever the file was copied', () => {
    const evening = new Date(2025, 4, 2, 18, 5, 9).toISOString();
    expect(recordedAt([file(nowMs, ['2025-05-02', '18:05:09'])], nowMs)).toBe(evening);
    expect(recordedAt([file(nowMs), file(nowMs, ['2025-05-02', '18:05:09'])], nowMs)).toBe(evening);
  });
  it.each([
    ['in the future', ['2026-12-03', '12:00:00']],
    ['that was never set', ['2020-01-01', '00:12:40']],
    ['that says a day without a time', ['2026-11-30', null]],
    ['more than ten years ago', ['2014-05-02', '12:00:00']],
  ] as const)('is not what a clock says %s', (_what, [date, time]) => {
    expect(recordedAt([file(nowMs - day, [date, time])], nowMs)).toBe(iso(nowMs - day));
  });
  it('believes a clock on the first of January soon after', () => {
    const newYearMs = new Date(2027, 0, 1, 12).getTime();
    expect(recordedAt([file(0, ['2027-01-01', '11:00:00'])], newYearMs)).toBe(
      iso(newYearMs - 60 * 60 * 1000),
    );
  });
});
