import { defineEntity, InferEntity, p } from '@mikro-orm/core';
import { addedFileStates } from '@thudline/contracts';
import { identity } from '../../database/identity';
import { Take } from '../../takes/entities/take.entity';

export type AddedFileState = (typeof addedFileStates)[number];

/** The two microphones of a take added with one choice; each choice once. What it holds comes when it is made. */
export const AddedFile = defineEntity({
  name: 'AddedFile',
  tableName: 'added_file',
  indexes: [
    {
      name: 'added_file_unfinished_index',
      expression: `create index "added_file_unfinished_index" on "added_file" ("state", "heartbeat_at") where "state" in ('queued', 'running')`,
    },
  ],
  uniques: [{ properties: ['take', 'flipped', 'shiftMs', 'gainDb'] }],
  properties: {
    ...identity,
    take: () => p.manyToOne(Take).ref().deleteRule('cascade'),
    flipped: p.boolean(),
    /** Rounded to a microsecond, so that the same choice is the same number. */
    shiftMs: p.double().$type<number>(),
    /** Rounded to a hundredth. */
    gainDb: p.double().$type<number>(),
    state: p.string().$type<AddedFileState>().length(20),
    /** 0–1 */
    progress: p.double().$type<number>(),
    /** How often a worker took it up; what an older attempt made is not kept. */
    attempt: p.integer().default(0),
    heartbeatAt: p.datetime(),
    /** One sentence for people where it failed. */
    reason: p.text().nullable(),
    objectKey: p.string().length(255).nullable(),
    sha256: p.string().length(64).nullable(),
    bytes: p.bigint('number').nullable(),
    frames: p.bigint('number').nullable(),
    sampleRateHz: p.integer().nullable(),
    levelDb: p.double().$type<number>().nullable(),
    truePeakDbtp: p.double().$type<number>().nullable(),
    listenGainDb: p.double().$type<number>().nullable(),
  },
});
export type AddedFile = InferEntity<typeof AddedFile>;
