import { z } from 'zod';
import { email, role } from './accounts';

const cursor = z.uuid('This place in the list is not known. Start from the top.');

export const listAccountsRequest = z.object({
  /** Part of a name or an address. */
  find: z.string().trim().max(100).optional(),
  /** The last account of the page before. */
  after: cursor.optional(),
});
export type ListAccountsRequest = z.infer<typeof listAccountsRequest>;

export const accountResponse = z.object({
  id: z.uuid(),
  name: z.string(),
  email: z.string(),
  emailVerified: z.boolean(),
  roles: z.array(role),
  locked: z.boolean(),
  joinedAt: z.iso.datetime(),
  /** When a session of theirs was used last, to a quarter of an hour; null where there is none any more. */
  seenAt: z.iso.datetime().nullable(),
  takes: z.int().nonnegative(),
  /** What they keep here: recordings, added files and photos, also of takes deleted not long ago. */
  bytes: z.int().nonnegative(),
  /** Their own limit; null: the installation's. */
  quotaBytes: z.int().nonnegative().nullable(),
  deleteAfter: z.iso.datetime().nullable(),
});
export type AccountResponse = z.infer<typeof accountResponse>;

/** Who joined last stands first. */
export const listAccountsResponse = z.object({
  items: z.array(accountResponse),
  next: z.uuid().nullable(),
  /** That fit what was looked for. */
  total: z.int().nonnegative(),
  /** Of every account. */
  bytes: z.int().nonnegative(),
});
export type ListAccountsResponse = z.infer<typeof listAccountsResponse>;

/** At least a take of any length; at most what an object store of one machine holds. */
const quotaBytes = z
  .int()
  .min(1_000_000, 'A limit is at least 1 MB.')
  .max(100_000_000_000_000, 'A limit is at most 100 TB.');

/** Absent leaves; null is the installation's limit. */
export const updateAccountRequest = z.strictObject({
  roles: z.array(role).max(3).optional(),
  locked: z.boolean().optional(),
  quotaBytes: quotaBytes.nullable().optional(),
});
export type UpdateAccountRequest = z.infer<typeof updateAccountRequest>;

export const failedWorkKinds = ['measurement', 'added-file', 'export', 'mail'] as const;
export const failedWork = z.object({
  kind: z.enum(failedWorkKinds),
  id: z.uuid(),
  at: z.iso.datetime(),
  /** "take 3", "verify". */
  what: z.string(),
  /** Whose; null where that isn't known. */
  account: z.object({ id: z.uuid(), name: z.string() }).nullable(),
  reason: z.string(),
  /** When it is tried again by itself; null: not without help. */
  againAt: z.iso.datetime().nullable(),
});
export type FailedWork = z.infer<typeof failedWork>;
export const listFailedWorkResponse = z.object({ items: z.array(failedWork) });
export type ListFailedWorkResponse = z.infer<typeof listFailedWorkResponse>;

export const listAuditRequest = z.object({ after: cursor.optional(), account: z.uuid().optional() });
export type ListAuditRequest = z.infer<typeof listAuditRequest>;

export const auditEntry = z.object({
  id: z.uuid(),
  at: z.iso.datetime(),
  kind: z.string(),
  /** Who did it; null where nobody is known, or they have gone. */
  account: z.object({ id: z.uuid(), name: z.string() }).nullable(),
  /** On whom, where it was done to an account. */
  subject: z.object({ id: z.uuid(), name: z.string() }).nullable(),
  address: z.string().nullable(),
});
export type AuditEntry = z.infer<typeof auditEntry>;
export const listAuditResponse = z.object({ items: z.array(auditEntry), next: z.uuid().nullable() });
export type ListAuditResponse = z.infer<typeof listAuditResponse>;

export const signUps = ['open', 'invited'] as const;

/** What whoever runs the installation decides. */
export const installationSettings = z.object({
  /** What one account may keep, where it has no limit of its own. */
  accountBytes: quotaBytes,
  /** Who may join: anybody, or whoever was invited. */
  signUp: z.enum(signUps),
});
export type InstallationSettings = z.infer<typeof installationSettings>;
export const updateInstallationRequest = installationSettings.partial().strict();
export type UpdateInstallationRequest = z.infer<typeof updateInstallationRequest>;

export const inviteRequest = z.object({ email });
export type InviteRequest = z.infer<typeof inviteRequest>;

/** What a guest may know before they join. */
export const signUpResponse = z.object({ signUp: z.enum(signUps) });
export type SignUpResponse = z.infer<typeof signUpResponse>;
