import { z } from 'zod';
import { photoResponse } from './photos';
import { text } from './text';

const whichOne = text().max(80, 'A microphone’s name has at most 80 characters.');
const between = (low: number, high: number, sentence: string) =>
  z.number({ error: sentence }).min(low, sentence).max(high, sentence).nullable();
const distanceSentence = 'A distance here lies between −300 and 500 cm.';
const distanceCm = between(-300, 500, distanceSentence);

/** Where the kick microphone stands. Null: not written down. */
export const kickPlace = z.object({
  /** Behind the front head's hole; negative: in front of it. */
  insideCm: distanceCm,
  /** Sideways from the middle of the drum, to the right as the player sits. */
  offCentreCm: distanceCm,
  /** Above the floor. */
  heightCm: distanceCm,
  /** Away from the beater. */
  turnedDeg: between(-180, 180, 'A microphone is turned by at most 180°.'),
  which: whichOne,
});
export type KickPlace = z.infer<typeof kickPlace>;

/** Where the overhead stands, from the middle of the snare. */
export const overheadPlace = z.object({
  aboveSnareCm: distanceCm,
  towardKickCm: distanceCm,
  awayFromHatCm: distanceCm,
  /** From looking straight down. */
  tiltedDeg: between(-180, 180, 'A microphone is tilted by at most 180°.'),
  which: whichOne,
});
export type OverheadPlace = z.infer<typeof overheadPlace>;

/** How one preamp is set: what it amplifies by and which of its switches are pressed. */
export const preamp = z.object({
  gainDb: between(-40, 100, 'A preamp’s gain lies between −40 and 100 dB.'),
  polarity: z.boolean(),
  pad: z.boolean(),
  lowCut: z.boolean(),
  phantom: z.boolean(),
});
export type Preamp = z.infer<typeof preamp>;

const name = text().max(60, 'A setup’s name has at most 60 characters.');

const setupFields = z.object({
  name,
  kick: kickPlace,
  overhead: overheadPlace,
  kickPreamp: preamp,
  overheadPreamp: preamp,
  /** What the microphones are plugged into. */
  interface: text().max(80, 'An interface’s name has at most 80 characters.'),
  rest: text().max(300, 'What else you want to remember has at most 300 characters.'),
});
export type SetupFields = z.infer<typeof setupFields>;

const noPreamp: Preamp = { gainDb: null, polarity: false, pad: false, lowCut: false, phantom: false };

/** A setup of which nothing is written down. */
export const emptySetup: SetupFields = {
  name: '',
  kick: { insideCm: null, offCentreCm: null, heightCm: null, turnedDeg: null, which: '' },
  overhead: { aboveSnareCm: null, towardKickCm: null, awayFromHatCm: null, tiltedDeg: null, which: '' },
  kickPreamp: noPreamp,
  overheadPreamp: noPreamp,
  interface: '',
  rest: '',
};

const { kick, overhead, kickPreamp, overheadPreamp, ...texts } = setupFields.shape;

/** PATCH: absent leaves as it is, also within a group; null clears. */
export const updateSetupRequest = z.object({
  name: name.min(1, 'Give the setup a name.').optional(),
  kick: kick.partial().optional(),
  overhead: overhead.partial().optional(),
  kickPreamp: kickPreamp.partial().optional(),
  overheadPreamp: overheadPreamp.partial().optional(),
  interface: texts.interface.optional(),
  rest: texts.rest.optional(),
});
export type UpdateSetupRequest = z.infer<typeof updateSetupRequest>;

/** Without a name it is called "Setup 3". */
export const createSetupRequest = updateSetupRequest.extend({
  name: name.default(''),
  /** The player's own setup it was copied from. */
  copiedFromId: z.uuid().optional(),
});
export type CreateSetupRequest = z.input<typeof createSetupRequest>;

const namedSetup = z.object({ id: z.uuid(), name: z.string() });
export type NamedSetup = z.infer<typeof namedSetup>;

export const setupResponse = setupFields.extend({
  id: z.uuid(),
  createdAt: z.iso.datetime(),
  copiedFrom: namedSetup.nullable(),
  photo: photoResponse.nullable(),
  takeCount: z.int().nonnegative(),
  /** The newest five takes recorded with it. */
  takes: z.array(z.object({ id: z.uuid(), number: z.int().positive() })),
  /** What the newest of its takes whose arrival could be told says; positive: the overhead hears the kick later. */
  measured: z
    .object({
      takeId: z.uuid(),
      number: z.int().positive(),
      arrivalMs: z.number(),
      arrivalIqrMs: z.number().nullable(),
    })
    .nullable(),
});
export type SetupResponse = z.infer<typeof setupResponse>;

export const setupListItem = setupResponse
  .pick({ id: true, name: true, kick: true, overhead: true, takeCount: true, createdAt: true })
  .extend({ lastUsedAt: z.iso.datetime().nullable() });
export type SetupListItem = z.infer<typeof setupListItem>;

/** The one recorded with last comes first, then the newest. */
export const listSetupsResponse = z.object({
  items: z.array(setupListItem),
  /** How things stand now: the one of the newest upload, or what a try-out's winner made since. */
  currentId: z.uuid().nullable(),
});
export type ListSetupsResponse = z.infer<typeof listSetupsResponse>;

/** Far more than anybody keeps apart; common practice, no source. */
export const maxSetups = 300;
