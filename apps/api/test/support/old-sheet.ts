import { TakeResponse } from '@thudline/contracts';
import { Measurement } from '../../src/measuring/entities/measurement.entity';
import { Report } from '../../src/reports/entities/report.entity';
import { Person, Upload } from './person';
import { giveReport, shortTakeFacts } from './reported-take';
import { TestApp } from './test-app';

/** Older than any version there has been. */
export const oldVersion = '0';

/** A take whose sheet an earlier version of the measurements made. */
export async function makeOldSheet(
  test: TestApp,
  person: Person,
  changed: Partial<Upload> = {},
): Promise<TakeResponse> {
  const take = await person.makeTake(changed);
  await giveReport(test, take, { ...(await shortTakeFacts()), version: 1 });
  await test.em().nativeUpdate(Measurement, { take: take.id }, { dspVersion: oldVersion });
  await test.em().nativeUpdate(Report, { take: take.id }, { createdAt: new Date('2026-11-03T10:00:00Z') });
  return take;
}
