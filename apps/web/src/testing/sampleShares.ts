import type { CreatedShareResponse, OpenedShareResponse, ShareResponse } from '@thudline/contracts';
import { takeId } from './sampleData';

export const shareToken = 'k3yk3yk3yk3yk3yk3yk3yk3yk3yk3yk3yk3yk3yk3y1';

export const sampleShare = (overrides: Partial<ShareResponse> = {}): ShareResponse => ({
  id: '01890000-0000-7000-8000-000000000101',
  subject: { kind: 'take', takeId },
  about: 'Loud chorus',
  label: '',
  question: 'May I stop moving the overhead now?',
  canListen: true,
  canDownload: false,
  canNote: false,
  hasPassphrase: false,
  mailedTo: null,
  createdAt: '2026-12-02T19:45:00.000Z',
  expiresAt: '2099-12-11T12:00:00.000Z',
  revokedAt: null,
  openedAt: null,
  openCount: 0,
  ...overrides,
});

export const sampleCreatedShare = (overrides: Partial<ShareResponse> = {}): CreatedShareResponse => ({
  ...sampleShare(overrides),
  url: `https://thudline.example.org/s/${shareToken}`,
});

export const sampleOpenedShare = (overrides: Partial<OpenedShareResponse> = {}): OpenedShareResponse => ({
  subject: { kind: 'take', takeId },
  from: 'Juno',
  question: 'May I stop moving the overhead now?',
  expiresAt: '2026-12-11T12:00:00.000Z',
  canListen: true,
  canDownload: false,
  canNote: false,
  ...overrides,
});
