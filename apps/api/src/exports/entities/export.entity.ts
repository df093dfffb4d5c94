import { defineEntity, InferEntity, p } from '@mikro-orm/core';
import { exportStates } from '@thudline/contracts';
import { identity } from '../../database/identity';
import { User } from '../../users/entities/user.entity';

export type ExportState = (typeof exportStates)[number];

/** Everything of an account in one archive. What it holds comes when it is made. */
export const Export = defineEntity({
  name: 'Export',
  tableName: 'export',
  indexes: [
    {
      name: 'export_unfinished_index',
      expression: `create index "export_unfinished_index" on "export" ("state", "heartbeat_at") where "state" in ('queued', 'running')`,
    },
  ],
  properties: {
    ...identity,
    owner: () => p.manyToOne(User).ref().index().deleteRule('cascade'),
    state: p.string().$type<ExportState>().length(20),
    /** 0–1 */
    progress: p.double().$type<number>(),
    /** How often a worker took it up; what an older attempt made is not kept. */
    attempt: p.integer().default(0),
    heartbeatAt: p.datetime(),
    /** One sentence for people where it failed. */
    reason: p.text().nullable(),
    objectKey: p.string().length(255).nullable(),
    sha256: p.string().length(64).nullable(),
    bytes: p.bigint('number').nullable(),
    /** Until when it can be downloaded. */
    expiresAt: p.datetime().nullable(),
  },
});
export type Export = InferEntity<typeof Export>;
