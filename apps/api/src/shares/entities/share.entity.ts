import { defineEntity, InferEntity, p } from '@mikro-orm/core';
import { identity } from '../../database/identity';
import { Room } from '../../rooms/entities/room.entity';
import { Take } from '../../takes/entities/take.entity';
import { TryOut } from '../../tryouts/entities/try-out.entity';
import { User } from '../../users/entities/user.entity';

/** Opens one sheet, comparison, try-out or room log to whoever holds its link, or to one person who is signed in. */
export const Share = defineEntity({
  name: 'Share',
  tableName: 'share',
  checks: [
    { name: 'share_one_subject_check', expression: 'num_nonnulls(take_id, try_out_id, room_id) = 1' },
    { name: 'share_other_take_check', expression: 'other_take_id is null or take_id is not null' },
    {
      name: 'share_opens_to_somebody_check',
      expression: 'num_nonnulls(token_hash, grantee_id, mailed_to) >= 1',
    },
  ],
  properties: {
    ...identity,
    owner: () => p.manyToOne(User).ref().index().deleteRule('cascade'),
    /** The take whose sheet it is; of a comparison, the take before. */
    take: () => p.manyToOne(Take).ref().nullable().index().deleteRule('cascade'),
    /** Of a comparison, the take after. */
    otherTake: () => p.manyToOne(Take).ref().nullable().index().deleteRule('cascade'),
    tryOut: () => p.manyToOne(TryOut).ref().nullable().index().deleteRule('cascade'),
    room: () => p.manyToOne(Room).ref().nullable().index().deleteRule('cascade'),
    /** Whoever it is open to without a link, once they are signed in. */
    grantee: () => p.manyToOne(User).ref().nullable().index().deleteRule('cascade'),
    /** SHA-256 of the token; the token itself is told once and kept nowhere. Null where no link is out. */
    tokenHash: p.string().length(64).nullable().unique(),
    passphraseHash: p.text().nullable(),
    /** Where it is mailed to; the mail is written with a token of its own. */
    mailedTo: p.string().length(254).nullable(),
    /** Who it is for, as its owner calls them. */
    label: p.string().length(60).default(''),
    question: p.string().length(300),
    canListen: p.boolean(),
    canDownload: p.boolean(),
    canNote: p.boolean().default(false),
    /** Null: until it is ended by hand. */
    expiresAt: p.datetime().nullable(),
    revokedAt: p.datetime().nullable(),
    /** When it was opened last, and how often. */
    openedAt: p.datetime().nullable(),
    openCount: p.integer().default(0),
  },
});
export type Share = InferEntity<typeof Share>;
