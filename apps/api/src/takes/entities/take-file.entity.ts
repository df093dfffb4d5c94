import { defineEntity, InferEntity, p } from '@mikro-orm/core';
import type { BroadcastFacts } from '@thudline/dsp';
import { identity } from '../../database/identity';
import { Take } from './take.entity';

export const TakeFile = defineEntity({
  name: 'TakeFile',
  tableName: 'take_file',
  properties: {
    ...identity,
    take: () => p.manyToOne(Take).ref().index().deleteRule('cascade'),
    /** Order in the upload. */
    position: p.smallint(),
    /** As the client called it, made safe; our own name is the object key. */
    name: p.string().length(255),
    objectKey: p.string().length(255).unique(),
    sha256: p.string().length(64).index(),
    bytes: p.bigint('number'),
    /** For people: `24-bit PCM`. */
    encoding: p.string().length(60),
    dataOffset: p.bigint('number'),
    blockAlign: p.integer(),
    frames: p.bigint('number'),
    channels: p.integer(),
    sampleRateHz: p.integer(),
    /** The header claimed more than the file holds. */
    cutShort: p.boolean(),
    /** What the recorder wrote into it; null for files without, and for those that came before it was read. */
    broadcast: p.json<BroadcastFacts>().nullable(),
  },
});
export type TakeFile = InferEntity<typeof TakeFile>;
