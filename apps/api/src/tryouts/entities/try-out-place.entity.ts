import { defineEntity, InferEntity, p } from '@mikro-orm/core';
import { identity } from '../../database/identity';
import { TryOut } from './try-out.entity';

/**
 * One position of a try-out. Its take is the owner's with this upload key, and may still be on its way: so a connection
 * lost between a take and a note of it can't part the two.
 */
export const TryOutPlace = defineEntity({
  name: 'TryOutPlace',
  tableName: 'try_out_place',
  uniques: [{ properties: ['tryOut', 'uploadKey'] }],
  properties: {
    ...identity,
    tryOut: () => p.manyToOne(TryOut).ref().deleteRule('cascade'),
    uploadKey: p.uuid(),
    /** Order in which they were played. */
    rank: p.smallint(),
    fileNames: p.json<string[]>(),
    position: p.double().$type<number>().nullable(),
    label: p.string().length(40),
    /** Taken out of the try-out; kept, so that it can be undone. */
    removedAt: p.datetime().nullable(),
  },
});
export type TryOutPlace = InferEntity<typeof TryOutPlace>;
