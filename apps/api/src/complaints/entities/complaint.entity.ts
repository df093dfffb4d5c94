import { defineEntity, InferEntity, p } from '@mikro-orm/core';
import { identity } from '../../database/identity';
import { Note } from '../../notes/entities/note.entity';
import { Take } from '../../takes/entities/take.entity';
import { User } from '../../users/entities/user.entity';

/** Somebody told that something is wrong with a note, or with a sheet; whoever runs the installation looks at it. */
export const Complaint = defineEntity({
  name: 'Complaint',
  tableName: 'complaint',
  properties: {
    ...identity,
    take: () => p.manyToOne(Take).ref().index().deleteRule('cascade'),
    note: () => p.manyToOne(Note).ref().nullable().index().deleteRule('cascade'),
    /** Null: a guest, or somebody who has left. */
    reporter: () => p.manyToOne(User).ref().nullable().index().deleteRule('set null'),
    reason: p.text(),
    settledAt: p.datetime().nullable(),
  },
});
export type Complaint = InferEntity<typeof Complaint>;
