import { defineEntity, InferEntity, p } from '@mikro-orm/core';
import { defaultUserSettings, Role, UserSettings } from '@thudline/contracts';
import { identity } from '../../database/identity';

export const User = defineEntity({
  name: 'User',
  tableName: 'user',
  properties: {
    ...identity,
    name: p.string().length(60),
    email: p.string().length(254),
    emailLower: p.string().length(254).unique(),
    /** When somebody opened the link that was sent to the address. */
    emailVerifiedAt: p.datetime().nullable(),
    passwordHash: p.text(),
    roles: p
      .array<Role>()
      .columnType('text[]')
      .onCreate((): Role[] => ['player']),
    /** As they were written; read through `settingsOf`, which knows what older rows lack. */
    settings: p.json<Partial<UserSettings>>().onCreate((): Partial<UserSettings> => defaultUserSettings),
    /** Number of the next take; raised inside the transaction that makes a take, whose row lock it is. */
    nextTakeNumber: p.integer().default(1),
    /** How the microphones stand now; the setup may have been removed since. */
    currentSetupId: p.uuid().nullable(),
    lockedAt: p.datetime().nullable(),
    /** From then on the account is closed, and goes for good with the next housekeeping; null unless it was asked for. */
    deleteAfter: p.datetime().nullable().index(),
    /** The end of the week that was told last; null before the first. */
    digestAt: p.datetime().nullable(),
    /** Where this account may keep more, or less, than others. */
    quotaBytes: p.bigint('number').nullable(),
  },
});
export type User = InferEntity<typeof User>;
