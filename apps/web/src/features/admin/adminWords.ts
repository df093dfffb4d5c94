import type { AuditEntry, FailedWork, Role } from '@thudline/contracts';
import { bytes, plural } from '../../lib/format';

/** "3 accounts keep 412.0 MB." */
export const accountsWords = (total: number, kept: number): string =>
  `${plural(total, 'account')} ${total === 1 ? 'keeps' : 'keep'} ${keptWords(kept)}.`;

/** 20 GB reads better than 20000.0 MB. */
export const keptWords = (size: number): string =>
  size === 0 ? 'nothing' : size >= 1e9 ? `${Number((size / 1e9).toFixed(1))} GB` : bytes(size);

const roleWords: Record<Role, string> = { player: 'player', teacher: 'teacher', admin: 'admin' };

/** "teacher, admin"; everybody is a player, so that is said only where nothing else is. */
export function rolesWords(roles: readonly Role[]): string {
  const others = roles.filter((role) => role !== 'player').map((role) => roleWords[role]);
  return others.length > 0 ? others.join(', ') : roleWords.player;
}

const workWords: Record<FailedWork['kind'], string> = {
  measurement: 'measuring',
  'added-file': 'added file',
  export: 'export',
  mail: 'mail',
};

/** "measuring take 3", "mail: verify". */
export const workTold = ({ kind, what }: FailedWork): string =>
  kind === 'mail'
    ? `mail: ${what}`
    : kind === 'export'
      ? 'export of everything'
      : `${workWords[kind]}, ${what}`;

const happened: Readonly<Record<string, string>> = {
  joined: 'joined',
  'signed-in': 'signed in',
  'sign-in-failed': 'could not sign in',
  'signed-out': 'signed out',
  'session-reused': 'was signed out: an old sign-in was used again',
  'phone-let-in': 'let a phone read along',
  'password-reset': 'set a new password from a mail',
  'password-changed': 'changed the password',
  'address-changed': 'changed the address',
  'deletion-asked': 'asked to delete the account',
  'deletion-stopped': 'kept the account after all',
  'account-deleted': 'an account was deleted',
  'export-asked': 'asked for everything in one archive',
  'account-locked': 'locked',
  'account-unlocked': 'unlocked',
  'roles-changed': 'changed the roles of',
  'quota-changed': 'changed the limit of',
  'settings-changed': 'changed the settings of the installation',
  'account-invited': 'invited somebody',
  'work-retried': 'had failed work done again',
  'take-deleted': 'deleted a take',
  'take-restored': 'brought a take back',
  'take-purged': 'a deleted take went for good',
  'share-made': 'made a link',
  'share-ended': 'ended a link',
  'complaint-made': 'said what is wrong with a note or a sheet',
  'complaint-settled': 'settled a complaint',
};

/** "Ada locked Mika"; a kind that is not known yet stays as it is. */
export function auditTold({ kind, account, subject }: AuditEntry): string {
  const words = happened[kind] ?? kind.replaceAll('-', ' ');
  const whom = subject ? ` ${subject.name}` : '';
  return account
    ? `${account.name} ${words}${whom}`
    : `${words.charAt(0).toUpperCase()}${words.slice(1)}${whom}`;
}
