import { defineEntity, InferEntity, p } from '@mikro-orm/core';
import { Report } from './report.entity';

export const PairSpectrum = defineEntity({
  name: 'PairSpectrum',
  tableName: 'pair_spectrum',
  primaryKeys: ['report', 'trackA', 'trackB'],
  properties: {
    report: () => p.manyToOne(Report).ref().primary().fieldName('report_id').deleteRule('cascade'),
    /** Indexes into the report's tracks. */
    trackA: p.smallint().primary(),
    trackB: p.smallint().primary(),
    binHz: p.double().$type<number>(),
    binCount: p.integer(),
    hitCount: p.integer(),
    /** Little-endian float32: Skk, Soo, Re Sko, Im Sko. */
    data: p.uint8array(),
  },
});
export type PairSpectrum = InferEntity<typeof PairSpectrum>;
