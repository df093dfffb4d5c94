import { z } from 'zod';

export const roles = ['player', 'teacher', 'admin'] as const;
export const role = z.enum(roles);
/** Roles add up; everyone is a player. */
export type Role = z.infer<typeof role>;

const email = z
  .string({ error: 'Write your e-mail address.' })
  .trim()
  .max(254, 'An e-mail address has at most 254 characters.')
  .pipe(z.email('Write a whole e-mail address, such as juno@example.org.'));

const password = z
  .string({ error: 'Write a password.' })
  .min(10, 'A password needs at least 10 characters.')
  .max(200, 'A password has at most 200 characters.');

export const joinRequest = z.object({
  name: z
    .string({ error: 'Write the name others should see.' })
    .trim()
    .min(1, 'Write the name others should see.')
    .max(60, 'A name has at most 60 characters.'),
  email,
  password,
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
});
export type UserSettings = z.infer<typeof userSettings>;

/** The target is common practice, no published source. */
export const defaultUserSettings: UserSettings = {
  lengthUnit: 'metre',
  temperatureUnit: 'celsius',
  temperatureC: 20,
  target: { lowDbfs: -12, highDbfs: -6, aimDbfs: -9 },
};

export const meResponse = z.object({
  id: z.uuid(),
  name: z.string(),
  email: z.string(),
  roles: z.array(role),
  settings: userSettings,
});
export type MeResponse = z.infer<typeof meResponse>;
