import { defineEntity, InferEntity, p } from '@mikro-orm/core';
import { identity } from '../../database/identity';
import { Note } from './note.entity';

/** One thing to do before the next take, asked for in a note. */
export const NextItem = defineEntity({
  name: 'NextItem',
  tableName: 'next_item',
  properties: {
    ...identity,
    note: () => p.manyToOne(Note).ref().index().deleteRule('cascade'),
    text: p.string().length(160),
    /** In the order they were written. */
    rank: p.integer(),
    /** When the player ticked it. */
    doneAt: p.datetime().nullable(),
  },
});
export type NextItem = InferEntity<typeof NextItem>;
