import { defineEntity, InferEntity, p } from '@mikro-orm/core';
import { FindingStatus, FindingTopic, Verdict } from '@thudline/contracts';
import { ClipRun, HitFacts, TakeFacts } from '@thudline/dsp';
import { Measurement } from '../../measuring/entities/measurement.entity';
import { Take } from '../../takes/entities/take.entity';

/** Facts only; judgements are computed on reading. What lists show or sort by has its own column. */
export const Report = defineEntity({
  name: 'Report',
  tableName: 'report',
  indexes: [
    {
      name: 'report_topics_index',
      expression: 'create index "report_topics_index" on "report" using gin ("topics")',
    },
    {
      name: 'report_untold_index',
      expression: 'create index "report_untold_index" on "report" ("measurement_id") where "topics" is null',
    },
  ],
  properties: {
    measurement: () => p.oneToOne(Measurement).ref().primary().deleteRule('cascade'),
    take: () => p.manyToOne(Take).ref().index().deleteRule('cascade'),
    createdAt: p.datetime().onCreate(() => new Date()),
    /** Hardest hit, null where there is none or it clipped. */
    kickPeakDbfs: p.double().$type<number>().nullable(),
    kickClipped: p.boolean(),
    overheadPeakDbfs: p.double().$type<number>().nullable(),
    overheadClipped: p.boolean(),
    kickNoiseDbfs: p.double().$type<number>().nullable(),
    overheadNoiseDbfs: p.double().$type<number>().nullable(),
    lowEndDb: p.double().$type<number>().nullable(),
    flipGainDb: p.double().$type<number>().nullable(),
    verdict: p.string().$type<Verdict>().length(20),
    /** How the two add up, as the finding says it; it depends on no target. */
    addingUp: p.string().$type<FindingStatus>().length(20),
    /** What the sheet says in words, judged by the owner's target: looked through by "find". */
    says: p.text(),
    /** What its findings ask something about, judged by the owner's target; null where it wasn't told yet. */
    topics: p.array<FindingTopic>().columnType('text[]').nullable(),
    /** The facts without hits and clipping runs: small, so that lists can read it. */
    summary: p.json<TakeFacts>(),
    hits: p.json<HitFacts[]>().lazy(true, false),
    /** One list a track. */
    clipRuns: p.json<ClipRun[][]>().lazy(true, false),
  },
});
export type Report = InferEntity<typeof Report>;
