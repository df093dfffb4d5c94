import { defineEntity, InferEntity, p } from '@mikro-orm/core';
import { identity } from '../../database/identity';
import { Setup } from '../../setups/entities/setup.entity';
import { Room } from '../../rooms/entities/room.entity';
import { User } from '../../users/entities/user.entity';

export const Take = defineEntity({
  name: 'Take',
  tableName: 'take',
  uniques: [{ properties: ['owner', 'uploadKey'] }, { properties: ['owner', 'number'] }],
  indexes: [
    { properties: ['room', 'recordedAt'] },
    {
      name: 'take_newest_first_index',
      expression:
        'create index "take_newest_first_index" on "take" ("owner_id", "recorded_at" desc, "id" desc) where "deleted_at" is null',
    },
    {
      name: 'take_deleted_index',
      expression:
        'create index "take_deleted_index" on "take" ("owner_id", "deleted_at") where "deleted_at" is not null',
    },
    {
      name: 'take_tags_index',
      expression: 'create index "take_tags_index" on "take" using gin ("tags")',
    },
  ],
  properties: {
    ...identity,
    owner: () => p.manyToOne(User).ref().deleteRule('cascade'),
    /** Counts a player's takes from 1. */
    number: p.integer(),
    title: p.string().length(120),
    note: p.text(),
    recordedAt: p.datetime(),
    uploadKey: p.uuid(),
    tickedActions: p.json<string[]>().onCreate((): string[] => []),
    tags: p
      .array<string>()
      .columnType('text[]')
      .default([])
      .onCreate((): string[] => []),
    /** What it was recorded with. */
    setup: () => p.manyToOne(Setup).ref().nullable().index().deleteRule('set null'),
    /** Where it was recorded. */
    room: () => p.manyToOne(Room).ref().nullable().deleteRule('set null'),
    /** The player's earlier take that this one follows. */
    followsTake: () => p.manyToOne(Take).ref().nullable().index().deleteRule('set null'),
    /** Which actions of that take were carried out before this one. */
    doneActions: p
      .json<string[]>()
      .default('[]')
      .onCreate((): string[] => []),
    /** The report the sheet shows; it belongs to a measurement of this take. */
    currentReportId: p.uuid().nullable(),
    deletedAt: p.datetime().nullable(),
  },
});
export type Take = InferEntity<typeof Take>;
