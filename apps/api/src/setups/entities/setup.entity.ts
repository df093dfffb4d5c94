import { defineEntity, InferEntity, p } from '@mikro-orm/core';
import { KickPlace, OverheadPlace, Preamp } from '@thudline/contracts';
import { identity } from '../../database/identity';
import { Photo } from '../../photos/entities/photo.entity';
import { User } from '../../users/entities/user.entity';

/** Where the microphones stood and how the preamps were set. Nothing sorts or looks by its numbers, so they are JSON. */
export const Setup = defineEntity({
  name: 'Setup',
  tableName: 'setup',
  properties: {
    ...identity,
    owner: () => p.manyToOne(User).ref().index().deleteRule('cascade'),
    name: p.string().length(60),
    kick: p.json<KickPlace>(),
    overhead: p.json<OverheadPlace>(),
    kickPreamp: p.json<Preamp>(),
    overheadPreamp: p.json<Preamp>(),
    interface: p.string().length(80),
    rest: p.string().length(300),
    copiedFrom: () => p.manyToOne(Setup).ref().nullable().index().deleteRule('set null'),
    photo: () => p.manyToOne(Photo).ref().nullable().index().deleteRule('set null'),
  },
});
export type Setup = InferEntity<typeof Setup>;
