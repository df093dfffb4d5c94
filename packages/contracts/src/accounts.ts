import { z } from 'zod';
import { text } from './text';

export const roles = ['player', 'teacher', 'admin'] as const;
export const role = z.enum(roles);
/** Roles add up; everyone is a player. */
export type Role = z.infer<typeof role>;

export const email = z
  .string({ error: 'Write your e-mail address.' })
  .trim()
  .max(254, 'An e-mail address has at most 254 characters.')
  .pipe(z.email('Write a whole e-mail address, such as juno@example.org.'));

const password = z
  .string({ error: 'Write a password.' })
  .min(10, 'A password needs at least 10 characters.')
  .max(200, 'A password has at most 200 characters.');

export const personName = text('Write the name others should see.')
  .min(1, 'Write the name others should see.')
  .max(60, 'A name has at most 60 characters.')
  // Names stand in mails to addresses that nobody has shown to be theirs; mail programs make links of such text.
  .refine((name) => !name.includes('://'), 'Write a name without the address of a page.');

export const joinRequest = z.object({
  name: personName,
  email,
  password,
  /** From the mail of an invitation, where joining needs one. */
  invitation: z.string().max(600).optional(),
});
export type JoinRequest = z.infer<typeof joinRequest>;

export const signInRequest = z.object({
  email,
  password: z.string({ error: 'Write your password.' }).min(1, 'Write your password.').max(200),
  /** False: the cookies end with the browser session. */
  stay: z.boolean().default(true),
});
export type SignInRequest = z.input<typeof signInRequest>;

/** Where the hardest hit should peak, and the level to set the preamp for; dBFS. */
export const target = z
  .object({
    lowDbfs: z.number().min(-40).max(-1),
    highDbfs: z.number().min(-40).max(-1),
    aimDbfs: z.number().min(-40).max(-1),
  })
  .refine((t) => t.lowDbfs < t.highDbfs, 'The target needs a lower and a higher end.')
  .refine((t) => t.aimDbfs >= t.lowDbfs && t.aimDbfs <= t.highDbfs, 'The aim lies inside the target.');
export type Target = z.infer<typeof target>;

export const userSettings = z.object({
  lengthUnit: z.enum(['metre', 'foot']),
  temperatureUnit: z.enum(['celsius', 'fahrenheit']),
  /** Air temperature while recording, for the speed of sound. */
  temperatureC: z.number().min(-20).max(50),
  target,
  /** Single keys act (Space, 1, 2, 3 …); some people need them off (WCAG 2.1.4). */
  singleKeys: z.boolean(),
  /** About what mails are wanted; mails that keep the account safe always come. */
  mailNotes: z.boolean(),
  mailSent: z.boolean(),
  mailOpened: z.boolean(),
  mailDigest: z.boolean(),
});
export type UserSettings = z.infer<typeof userSettings>;

/** The target is common practice, no published source. */
export const defaultUserSettings: UserSettings = {
  lengthUnit: 'metre',
  temperatureUnit: 'celsius',
  temperatureC: 20,
  target: { lowDbfs: -12, highDbfs: -6, aimDbfs: -9 },
  singleKeys: true,
  mailNotes: true,
  mailSent: true,
  mailOpened: true,
  mailDigest: false,
};

/** About what somebody can choose to get mails. */
export const mailChoices = ['notes', 'sent', 'opened', 'digest'] as const;
export type MailChoice = (typeof mailChoices)[number];

/** Which setting says so. */
export const mailSettings = {
  notes: 'mailNotes',
  sent: 'mailSent',
  opened: 'mailOpened',
  digest: 'mailDigest',
} as const satisfies Record<MailChoice, keyof UserSettings>;

/** PATCH: absent leaves as it is. */
export const updateMeRequest = z.object({
  name: personName.optional(),
  settings: userSettings.partial().optional(),
});
export type UpdateMeRequest = z.infer<typeof updateMeRequest>;

export const meResponse = z.object({
  id: z.uuid(),
  name: z.string(),
  email: z.string(),
  emailVerified: z.boolean(),
  roles: z.array(role),
  settings: userSettings,
  /** True on a phone that was let in to read along: nothing can be changed from it. */
  readOnly: z.boolean(),
  /** When the account goes, where its deletion was asked for. */
  deleteAfter: z.iso.datetime().nullable(),
});
export type MeResponse = z.infer<typeof meResponse>;

const oneTimeToken = z.string().min(20, 'This link is not whole. Open it again from the mail.').max(200);

/** Answers alike whether there is such an account or not. */
export const forgotRequest = z.object({ email });
export type ForgotRequest = z.infer<typeof forgotRequest>;

export const resetRequest = z.object({ token: oneTimeToken, password });
export type ResetRequest = z.infer<typeof resetRequest>;

export const verifyRequest = z.object({ token: oneTimeToken });
export type VerifyRequest = z.infer<typeof verifyRequest>;

export const changePasswordRequest = z.object({
  oldPassword: z.string({ error: 'Write your password.' }).min(1, 'Write your password.').max(200),
  password,
});
export type ChangePasswordRequest = z.infer<typeof changePasswordRequest>;

/** "Show on my phone": a code to scan. The link works once, within minutes, and signs in to read only. */
export const phoneLinkResponse = z.object({ url: z.url(), expiresAt: z.iso.datetime() });
export type PhoneLinkResponse = z.infer<typeof phoneLinkResponse>;

export const openPhoneLinkRequest = z.object({ token: oneTimeToken });
export type OpenPhoneLinkRequest = z.infer<typeof openPhoneLinkRequest>;

const ownPassword = z.string({ error: 'Write your password.' }).min(1, 'Write your password.').max(200);

/** The address changes when the link in the mail to it is opened. */
export const changeEmailRequest = z.object({ email, password: ownPassword });
export type ChangeEmailRequest = z.infer<typeof changeEmailRequest>;

export const confirmEmailRequest = z.object({ token: oneTimeToken });
export type ConfirmEmailRequest = z.infer<typeof confirmEmailRequest>;

export const sessionResponse = z.object({
  id: z.uuid(),
  /** "Firefox on Linux"; what a browser says of itself. */
  device: z.string(),
  /** The one that asks. */
  current: z.boolean(),
  readOnly: z.boolean(),
  /** To a quarter of an hour. */
  usedAt: z.iso.datetime(),
});
export type SessionResponse = z.infer<typeof sessionResponse>;

/** This one first, then what was used last. */
export const listSessionsResponse = z.object({ items: z.array(sessionResponse) });
export type ListSessionsResponse = z.infer<typeof listSessionsResponse>;

/** How long somebody can change their mind. */
export const deletionGraceDays = 7;

export const deleteAccountRequest = z.object({ password: ownPassword });
export type DeleteAccountRequest = z.infer<typeof deleteAccountRequest>;
