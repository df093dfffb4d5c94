import type { ExportResponse } from '@thudline/contracts';
import { holdsWords, madeWords, progressWords } from './exportWords';

const made: ExportResponse = {
  id: '01890000-0000-7000-8000-000000000001',
  createdAt: '2026-12-01T10:00:00.000Z',
  state: 'done',
  progress: 1,
  reason: null,
  file: { name: 'thudline 2026-12-01.zip', bytes: 310e6, expiresAt: '2026-12-08T10:00:00.000Z' },
};

describe('the words for an archive', () => {
  it('say what it holds, and leave out what there is none of', () => {
    expect(holdsWords({ takes: 20, rooms: 3, notes: 1, bytes: 310e6 })).toBe(
      '20 takes, 3 rooms, 1 note: one ZIP of about 310.0 MB.',
    );
    expect(holdsWords({ takes: 1, rooms: 0, notes: 0, bytes: 5e6 })).toBe('1 take: one ZIP of about 5.0 MB.');
    expect(holdsWords({ takes: 0, rooms: 0, notes: 0, bytes: 0 })).toBe(
      'Your settings; there is no take yet.',
    );
  });

  it('say how far it is', () => {
    expect(progressWords({ ...made, state: 'queued', progress: 0 })).toBe('It waits for its turn.');
    expect(progressWords({ ...made, state: 'running', progress: 0.499 })).toBe('49 % is in it.');
  });

  it('say until when it can be fetched', () => {
    const at = new Date('2026-12-01T10:00:30.000Z');
    expect(madeWords(made, at)).toBe('Made just now; it stays until 8 Dec.');
  });
});
