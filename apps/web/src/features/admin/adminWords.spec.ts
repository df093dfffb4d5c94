import type { AuditEntry, FailedWork } from '@thudline/contracts';
import { accountsWords, auditTold, keptWords, rolesWords, workTold } from './adminWords';

const entry = (part: Partial<AuditEntry>): AuditEntry => ({
  id: '01890000-0000-7000-8000-000000000001',
  at: '2026-12-01T10:00:00.000Z',
  kind: 'joined',
  account: null,
  subject: null,
  address: null,
  ...part,
});
const ada = { id: '01890000-0000-7000-8000-000000000002', name: 'Ada' };
const mika = { id: '01890000-0000-7000-8000-000000000003', name: 'Mika' };

it('what is kept is told in the unit one would say', () => {
  expect([0, 4e5, 12.34e6, 20e9, 1.25e9].map(keptWords)).toEqual([
    'nothing',
    '400 kB',
    '12.3 MB',
    '20 GB',
    '1.3 GB',
  ]);
  expect(accountsWords(1, 0)).toBe('1 account keeps nothing.');
  expect(accountsWords(3, 412e6)).toBe('3 accounts keep 412.0 MB.');
});

it('roles are told without the one that everybody has', () => {
  expect(rolesWords(['player'])).toBe('player');
  expect(rolesWords(['player', 'teacher', 'admin'])).toBe('teacher, admin');
});

it('what happened is a sentence with whom it happened to', () => {
  expect(auditTold(entry({ account: mika }))).toBe('Mika joined');
  expect(auditTold(entry({ kind: 'account-locked', account: ada, subject: mika }))).toBe('Ada locked Mika');
  expect(auditTold(entry({ kind: 'account-deleted' }))).toBe('An account was deleted');
  expect(auditTold(entry({ kind: 'note-reported' }))).toBe('Note reported');
});

it('work that failed is named by what it was about', () => {
  const work = (kind: FailedWork['kind'], what: string) => workTold({ kind, what } as FailedWork);
  expect(work('measurement', 'take 3')).toBe('measuring, take 3');
  expect(work('mail', 'verify')).toBe('mail: verify');
  expect(work('export', 'everything')).toBe('export of everything');
});
