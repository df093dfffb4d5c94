import { defineEntity, InferEntity, p } from '@mikro-orm/core';
import { measurementStages, measurementStates } from '@thudline/contracts';
import { identity } from '../../database/identity';
import { Take } from '../../takes/entities/take.entity';

export type MeasurementState = (typeof measurementStates)[number];
export type MeasurementStage = (typeof measurementStages)[number];

/** One measuring of a take with one version of the measurements; its state is the only state there is. */
export const Measurement = defineEntity({
  name: 'Measurement',
  tableName: 'measurement',
  indexes: [
    {
      // What failed or was cancelled stays as it was; measuring again adds a row.
      name: 'measurement_once_index',
      expression: `create unique index "measurement_once_index" on "measurement" ("take_id", "dsp_version", "input_hash") where "state" in ('queued', 'running', 'done')`,
    },
    { properties: ['take'] },
    {
      name: 'measurement_unfinished_index',
      expression: `create index "measurement_unfinished_index" on "measurement" ("state", "heartbeat_at") where "state" in ('queued', 'running')`,
    },
  ],
  properties: {
    ...identity,
    take: () => p.manyToOne(Take).ref().deleteRule('cascade'),
    dspVersion: p.string().length(40),
    /** SHA-256 over what was measured: the files' hashes, channels and roles. */
    inputHash: p.string().length(64),
    state: p.string().$type<MeasurementState>().length(20),
    stage: p.string().$type<MeasurementStage>().length(40).nullable(),
    /** 0–1 over the whole measurement. */
    progress: p.double().$type<number>(),
    /** How often a worker took it up; results of an older attempt are not written. */
    attempt: p.integer().default(0),
    heartbeatAt: p.datetime(),
    /** One sentence for people where it failed. */
    reason: p.text().nullable(),
    /** Measures a sheet of an earlier version again, after an upgrade: nobody waits for it, and it waits for everybody. */
    renewal: p.boolean().default(false),
  },
});
export type Measurement = InferEntity<typeof Measurement>;
