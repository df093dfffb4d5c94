import { p } from '@mikro-orm/core';
import { v7 } from 'uuid';

/** Primary key (UUIDv7: sorts by time of making) and time of making, the same for every table that has an id. */
export const identity = {
  id: p
    .uuid()
    .primary()
    .onCreate(() => v7()),
  createdAt: p.datetime().onCreate(() => new Date()),
};
