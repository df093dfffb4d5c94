import { defineEntity, InferEntity, p } from '@mikro-orm/core';
import { TrackRole } from '@thudline/contracts';
import { identity } from '../../database/identity';
import { TakeFile } from './take-file.entity';
import { Take } from './take.entity';

export const TakeTrack = defineEntity({
  name: 'TakeTrack',
  tableName: 'take_track',
  uniques: [{ properties: ['file', 'channel'] }],
  properties: {
    ...identity,
    take: () => p.manyToOne(Take).ref().index().deleteRule('cascade'),
    file: () => p.manyToOne(TakeFile).ref().deleteRule('cascade'),
    /** Order on the sheet: kick before overhead. */
    position: p.smallint(),
    channel: p.smallint(),
    role: p.string().$type<TrackRole>().length(40),
  },
});
export type TakeTrack = InferEntity<typeof TakeTrack>;
