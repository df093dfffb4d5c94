import type { ShareResponse } from '@thudline/contracts';
import { isOpen, mayDoWords, openedWords, rightsWords, whoHasItWords } from './shareWords';
import { openUntilWords } from './openUntilWords';

const now = new Date('2026-12-04T20:00:00');
const share = (overrides: Partial<ShareResponse> = {}): ShareResponse => ({
  id: '01890000-0000-7000-8000-000000000101',
  subject: { kind: 'take', takeId: '01890000-0000-7000-8000-000000000001' },
  about: 'Loud chorus',
  label: '',
  question: '',
  canListen: true,
  canDownload: false,
  canNote: false,
  hasPassphrase: false,
  mailedTo: null,
  createdAt: '2026-12-02T19:00:00.000Z',
  expiresAt: '2026-12-11T12:00:00.000Z',
  revokedAt: null,
  openedAt: null,
  openCount: 0,
  ...overrides,
});

describe('words about a link', () => {
  it('says until when it opens', () => {
    expect(openUntilWords(share())).toBe('open until 11 Dec');
    expect(openUntilWords(share({ expiresAt: null }))).toBe('open until it is ended');
  });

  it('says whether it was opened, when last and how often', () => {
    const openedAt = new Date('2026-12-04T18:15:00').toISOString();
    expect(openedWords(share(), now)).toBe('Not opened yet.');
    expect(openedWords(share({ openedAt, openCount: 1 }), now)).toBe('Opened today 18:15.');
    expect(openedWords(share({ openedAt, openCount: 2 }), now)).toBe('Opened today 18:15, twice so far.');
    expect(openedWords(share({ openedAt, openCount: 5 }), now)).toBe('Opened today 18:15, 5 times so far.');
  });

  it('says what it allows', () => {
    expect(rightsWords(share())).toBe('Open until 11 Dec, with listening.');
    expect(rightsWords(share({ canDownload: true }))).toBe(
      'Open until 11 Dec, with listening and the files.',
    );
    expect(rightsWords(share({ canListen: false }))).toBe('Open until 11 Dec, to read only.');
  });

  it('says that notes may be left and that a passphrase is asked for', () => {
    expect(rightsWords(share({ canNote: true, hasPassphrase: true }))).toBe(
      'Open until 11 Dec, with listening, notes and a passphrase.',
    );
    expect(mayDoWords(share({ canNote: true }))).toBe('read, hear and leave notes on it');
    expect(mayDoWords(share({ canListen: false }))).toBe('read it');
  });

  it('says who has it', () => {
    expect(whoHasItWords(share())).toBe('');
    expect(whoHasItWords(share({ label: 'Oda' }))).toBe('Oda has it.');
    expect(whoHasItWords(share({ mailedTo: 'bex@example.org' }))).toBe('Mailed to bex@example.org.');
  });

  it('knows an ended and a timed-out link from an open one', () => {
    expect(isOpen(share(), now)).toBe(true);
    expect(isOpen(share({ expiresAt: null }), now)).toBe(true);
    expect(isOpen(share({ expiresAt: '2026-12-03T12:00:00.000Z' }), now)).toBe(false);
    expect(isOpen(share({ revokedAt: '2026-12-03T12:00:00.000Z' }), now)).toBe(false);
  });
});
