import { TakeResponse } from '@thudline/contracts';
import {
  bytesSource,
  encodePairSpectrum,
  measureTake,
  openWav,
  TakeFacts,
  TakeMeasurement,
} from '@thudline/dsp';
import { Measurement } from '../../src/measuring/entities/measurement.entity';
import { PairSpectrum } from '../../src/reports/entities/pair-spectrum.entity';
import { Report } from '../../src/reports/entities/report.entity';
import { pairSpectrumColumns, reportColumns } from '../../src/reports/report-columns';
import { toldColumns } from '../../src/reports/reports.mapper';
import { Take } from '../../src/takes/entities/take.entity';
import { settingsOf } from '../../src/users/user-settings';
import { monoTracks, shortTake } from './recordings';
import { TestApp } from './test-app';

/** What a worker finds in the short take: hardly anything, but whole facts. */
export async function shortTakeFacts(): Promise<TakeFacts> {
  const tracks = await Promise.all(
    shortTake().files.map(async ({ bytes }, index) => ({
      role: monoTracks[index].role,
      source: (await openWav(bytesSource(bytes))).track(0),
    })),
  );
  return (await measureTake({ tracks })).facts;
}

/** Gives a stored take a report without measuring: the facts are the test's. */
export async function giveReport(
  test: TestApp,
  { id }: TakeResponse,
  facts: TakeFacts,
  pairSpectra: TakeMeasurement['pairSpectra'] = [],
): Promise<void> {
  const em = test.em();
  const measurement = await em.findOneOrFail(Measurement, { take: id });
  Object.assign(measurement, { state: 'done', progress: 1 });
  const take = await em.findOneOrFail(Take, { id }, { populate: ['owner'] });
  const columns = reportColumns(facts);
  const report = em.create(Report, {
    measurement,
    take,
    ...columns,
    ...toldColumns(facts, settingsOf(take.owner.unwrap())),
  });
  const encoded = pairSpectra.map((spectrum) => spectrum && encodePairSpectrum(spectrum));
  for (const spectrum of pairSpectrumColumns(facts, encoded))
    em.create(PairSpectrum, { report, ...spectrum });
  take.currentReportId = measurement.id;
  await em.flush();
}
