import { defineEntity, InferEntity, p } from '@mikro-orm/core';
import { identity } from '../../database/identity';

export const auditKinds = [
  'joined',
  'signed-in',
  'sign-in-failed',
  'signed-out',
  'session-reused',
  'phone-let-in',
  'password-reset',
  'password-changed',
  'address-changed',
  'deletion-asked',
  'deletion-stopped',
  'account-deleted',
  'export-asked',
  'account-locked',
  'account-unlocked',
  'roles-changed',
  'quota-changed',
  'settings-changed',
  'account-invited',
  'work-retried',
  'take-deleted',
  'take-restored',
  'take-purged',
  'share-made',
  'share-ended',
  'complaint-made',
  'complaint-settled',
  'share-reopened',
] as const;
export type AuditKind = (typeof auditKinds)[number];

/** No foreign keys: what happened stays told when its user or take is gone. */
export const AuditEvent = defineEntity({
  name: 'AuditEvent',
  tableName: 'audit_event',
  indexes: [{ properties: ['userId', 'createdAt'] }],
  properties: {
    ...identity,
    kind: p.string().$type<AuditKind>().length(40),
    userId: p.uuid().nullable(),
    subjectId: p.uuid().nullable(),
    address: p.string().length(64).nullable(),
  },
});
export type AuditEvent = InferEntity<typeof AuditEvent>;
