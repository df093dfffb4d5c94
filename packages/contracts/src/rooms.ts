import { z } from 'zod';
import { photoResponse } from './photos';
import { findingStatus } from './reports';
import { text, textOfLines } from './text';

const lengthM = z
  .number()
  .positive('A length is more than nothing.')
  .max(100, 'A room is at most 100 m long.');
const placeM = z.number().min(0, 'A place lies inside the room.').max(100, 'A place lies inside the room.');

/** A box, or a volume with the surface around it. Null: not written down. */
export const roomShape = z.discriminatedUnion('kind', [
  z.object({
    kind: z.literal('box'),
    lengthM: lengthM.nullable(),
    widthM: lengthM.nullable(),
    heightM: lengthM.nullable(),
  }),
  z.object({
    kind: z.literal('other'),
    volumeM3: z.number().positive('A volume is more than nothing.').max(100_000).nullable(),
    surfaceM2: z.number().positive('A surface is more than nothing.').max(100_000).nullable(),
  }),
]);
export type RoomShape = z.infer<typeof roomShape>;

/** On the plan the length runs from left to right, and the front is at the bottom. */
export const surfacePlaces = ['floor', 'ceiling', 'front', 'back', 'left', 'right'] as const;

export const roomSurface = z.object({
  place: z.enum(surfacePlaces),
  /** Of the absorption table. */
  materialId: z.string().max(40),
  /** Null: all that nothing else covers. */
  areaM2: z.number().positive('An area is more than nothing.').max(10_000).nullable(),
});
export type RoomSurface = z.infer<typeof roomSurface>;

/** From the left and from the front. */
export const planPlace = z.object({ xM: placeM, yM: placeM });
export type PlanPlace = z.infer<typeof planPlace>;

export const kitPlace = planPlace.extend({
  /** Which way the player looks: 0 to the right, counterclockwise. */
  turnedDeg: z.number().min(-180).max(360),
});
export type KitPlace = z.infer<typeof kitPlace>;

const roomName = text().min(1, 'Give the room a name.').max(60, 'A room’s name has at most 60 characters.');
const temperatureC = z
  .number()
  .min(-20, 'A room is between −20 and 50 °C.')
  .max(50, 'A room is between −20 and 50 °C.');

const roomFields = {
  name: roomName,
  shape: roomShape,
  surfaces: z.array(roomSurface).max(30, 'A room has at most 30 surfaces.'),
  temperatureC: temperatureC.nullable(),
  kit: kitPlace.nullable(),
};

export const createRoomRequest = z.object({
  name: roomName,
  shape: roomFields.shape.default({ kind: 'box', lengthM: null, widthM: null, heightM: null }),
  surfaces: roomFields.surfaces.default([]),
  temperatureC: roomFields.temperatureC.default(null),
  kit: roomFields.kit.default(null),
});
export type CreateRoomRequest = z.input<typeof createRoomRequest>;

/** PATCH: absent leaves as it is, null clears. */
export const updateRoomRequest = z.object(roomFields).partial();
export type UpdateRoomRequest = z.infer<typeof updateRoomRequest>;

export const roomResponse = z.object({
  ...roomFields,
  id: z.uuid(),
  createdAt: z.iso.datetime(),
  takeCount: z.int().nonnegative(),
  /** When the first of its takes was recorded. */
  firstTakeAt: z.iso.datetime().nullable(),
  lastTakeAt: z.iso.datetime().nullable(),
  changeCount: z.int().nonnegative(),
  photo: photoResponse.nullable(),
});
export type RoomResponse = z.infer<typeof roomResponse>;

export const listRoomsResponse = z.object({ items: z.array(roomResponse) });
export type ListRoomsResponse = z.infer<typeof listRoomsResponse>;

export const maxRooms = 50;
export const maxChanges = 500;

export const changeCategories = [
  'placement',
  'soft-material',
  'hard-material',
  'floor',
  'noise',
  'other',
] as const;
export type ChangeCategory = (typeof changeCategories)[number];

const takeIds = z
  .array(z.uuid())
  .max(10, 'A change has at most 10 takes on each side.')
  .transform((ids) => [...new Set(ids)]);

const changeFields = {
  happenedOn: z.iso.date('Say on which day it was.'),
  what: text().min(1, 'Say what you changed.').max(120, 'What you changed has at most 120 characters.'),
  category: z.enum(changeCategories),
  place: planPlace.nullable(),
  /** In words: "30 spent", "borrowed". */
  cost: text().max(40, 'A cost has at most 40 characters.'),
  note: textOfLines().max(2000, 'A note has at most 2,000 characters.'),
  beforeTakeIds: takeIds,
  afterTakeIds: takeIds,
};

export const createRoomChangeRequest = z.object({
  happenedOn: changeFields.happenedOn,
  what: changeFields.what,
  category: changeFields.category.default('other'),
  place: changeFields.place.default(null),
  cost: changeFields.cost.default(''),
  note: changeFields.note.default(''),
  /** Without: the newest take recorded before that day, and the first one after it. */
  beforeTakeIds: takeIds.optional(),
  afterTakeIds: takeIds.optional(),
});
export type CreateRoomChangeRequest = z.input<typeof createRoomChangeRequest>;

/** PATCH: absent leaves as it is, null clears. */
export const updateRoomChangeRequest = z.object({
  ...z.object(changeFields).partial().shape,
  /** Among the changes of one day: lower stands earlier. */
  rank: z.int().min(-10_000).max(10_000).optional(),
});
export type UpdateRoomChangeRequest = z.infer<typeof updateRoomChangeRequest>;

const takeOfRoom = z.object({ id: z.uuid(), number: z.int().positive(), title: z.string() });
export type TakeOfRoom = z.infer<typeof takeOfRoom>;

/** One figure of the takes before against those after. */
export const changeFigure = z.object({
  key: z.string(),
  unit: z.enum(['dB', 'dBFS', 'ms', 's']),
  before: z.number().nullable(),
  after: z.number().nullable(),
  change: z.number().nullable(),
  /** Of the change; null for figures of a whole take. */
  interval95: z.object({ low: z.number(), high: z.number() }).nullable(),
  step: z.object({ kind: z.enum(['share', 'difference']), size: z.number() }),
  clear: z.boolean(),
  word: z.string().nullable(),
  hitsBefore: z.int().nonnegative().nullable(),
  hitsAfter: z.int().nonnegative().nullable(),
});
export type ChangeFigure = z.infer<typeof changeFigure>;

export const roomChangeResponse = z.object({
  id: z.uuid(),
  /** Counts the room's changes from 1, by day. */
  number: z.int().positive(),
  happenedOn: z.iso.date(),
  rank: z.int(),
  what: z.string(),
  category: z.enum(changeCategories),
  place: planPlace.nullable(),
  cost: z.string(),
  note: z.string(),
  before: z.array(takeOfRoom),
  after: z.array(takeOfRoom),
  /** False where it is still to be told: only as many as were asked for are compared at once. */
  isTold: z.boolean(),
  /** What it did, in words: strong, then rest; a question mark where it can't be told. */
  did: z.object({ status: findingStatus, strong: z.string(), rest: z.string() }),
  /** Sentences: what else lies between the takes, and what is therefore not compared. */
  caveats: z.array(z.string()),
  /** The most telling figures first; none where nothing can be compared. */
  figures: z.array(changeFigure),
  photo: photoResponse.nullable(),
});
export type RoomChangeResponse = z.infer<typeof roomChangeResponse>;

/** Comparing takes time: the first sight of a long log asks for its newest changes only. */
export const listRoomChangesRequest = z.object({
  told: z.coerce.number().int().min(0).max(maxChanges).default(maxChanges),
});
export type ListRoomChangesRequest = z.output<typeof listRoomChangesRequest>;

export const listRoomChangesResponse = z.object({
  /** Newest first. */
  items: z.array(roomChangeResponse),
  /** The newest takes of the room, to choose from; newest first. */
  takes: z.array(takeOfRoom.extend({ recordedAt: z.iso.datetime() })),
});
export type ListRoomChangesResponse = z.infer<typeof listRoomChangesResponse>;

export const trendFigures = [
  'decay-500',
  'decay-1000',
  'decay-2000',
  'decay-4000',
  'early-to-late-500',
  'brightness',
  'noise-kick',
  'noise-overhead',
  'cymbals-over-drums',
  'hardest-kick',
  'hardest-overhead',
  'low-end',
  'arrival',
] as const;
export type TrendFigure = (typeof trendFigures)[number];

export const roomTrendRequest = z.object({ figure: z.enum(trendFigures).default('decay-500') });
export type RoomTrendRequest = z.infer<typeof roomTrendRequest>;

export const trendPoint = z.object({
  takeId: z.uuid(),
  number: z.int().positive(),
  recordedAt: z.iso.datetime(),
  value: z.number(),
  /** Distance between the quartiles over its hits; null for figures of a whole take. */
  iqr: z.number().nonnegative().nullable(),
  /** What it was recorded with. */
  setup: z.object({ id: z.uuid(), name: z.string() }).nullable(),
});
export type TrendPoint = z.infer<typeof trendPoint>;

/** Every take of the room, or of the setup, that holds the figure, oldest first. */
export const roomTrendResponse = z.object({ figure: z.enum(trendFigures), points: z.array(trendPoint) });
export type RoomTrendResponse = z.infer<typeof roomTrendResponse>;
