import { recordedAt } from './recordedAt';

const nowMs = Date.UTC(2026, 11, 1, 20);
const day = 24 * 60 * 60 * 1000;
const iso = (ms: number) => new Date(ms).toISOString();

describe('when a take was recorded', () => {
  it('is when the later of its files was written', () => {
    const files = [{ lastModified: nowMs - 2 * day }, { lastModified: nowMs - day }];
    expect(recordedAt(files, nowMs)).toBe(iso(nowMs - day));
  });
  it('is now when the files are older than a month', () => {
    expect(recordedAt([{ lastModified: nowMs - 31 * day }], nowMs)).toBe(iso(nowMs));
  });
  it('is now when the files claim to be from the future', () => {
    expect(recordedAt([{ lastModified: nowMs + 1000 }], nowMs)).toBe(iso(nowMs));
  });
});
