import { defineEntity, InferEntity, p } from '@mikro-orm/core';
import { FindingTopic, NotePin } from '@thudline/contracts';
import { identity } from '../../database/identity';
import { Share } from '../../shares/entities/share.entity';
import { Take } from '../../takes/entities/take.entity';
import { User } from '../../users/entities/user.entity';

/** Who took a note away: only they may bring it back. */
export type Remover = 'author' | 'player' | 'admin';

/** What somebody wrote on a sheet, pinned to what it speaks of; or an answer to that. */
export const Note = defineEntity({
  name: 'Note',
  tableName: 'note',
  indexes: [{ properties: ['take', 'id'] }],
  checks: [
    { name: 'note_one_pin_check', expression: 'num_nonnulls(pin_time_s, finding_topic) <= 1' },
    { name: 'note_pin_topic_check', expression: `(finding_topic is not null) = (pin_kind = 'finding')` },
    { name: 'note_one_writer_check', expression: 'author_id is null or guest_id is null' },
  ],
  properties: {
    ...identity,
    take: () => p.manyToOne(Take).ref().deleteRule('cascade'),
    /** The note that this one answers; threads are one level deep. */
    parent: () => p.manyToOne(Note).ref().nullable().index().deleteRule('cascade'),
    /** Null: a guest, or somebody who has left. */
    author: () => p.manyToOne(User).ref().nullable().index().deleteRule('set null'),
    /** The link or the grant it was written by; none for the take's player. */
    share: () => p.manyToOne(Share).ref().nullable().index().deleteRule('set null'),
    /** Whose browser it was written in, and the name they gave there. */
    guestId: p.uuid().nullable(),
    guestName: p.string().length(60).nullable(),
    pinKind: p.string().$type<NotePin['kind']>().length(10),
    pinTimeS: p.double().$type<number>().nullable(),
    findingTopic: p.string().$type<FindingTopic>().length(30).nullable(),
    body: p.text(),
    editedAt: p.datetime().nullable(),
    deletedAt: p.datetime().nullable(),
    removedBy: p.string().$type<Remover>().length(10).nullable(),
  },
});
export type Note = InferEntity<typeof Note>;
