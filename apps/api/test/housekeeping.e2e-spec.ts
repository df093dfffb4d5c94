import { EntityManager } from '@mikro-orm/postgresql';
import { listTakesResponse, paths } from '@thudline/contracts';
import { Session } from '../src/auth/entities/session.entity';
import { AuditEvent } from '../src/audit/entities/audit-event.entity';
import { AccountPurge } from '../src/housekeeping/account-purge';
import { ExportPurge } from '../src/housekeeping/export-purge';
import { HousekeepingService } from '../src/housekeeping/housekeeping.service';
import { StoreRepair } from '../src/housekeeping/store-repair';
import { TakePurge } from '../src/housekeeping/take-purge';
import { Measurement } from '../src/measuring/entities/measurement.entity';
import { Report } from '../src/reports/entities/report.entity';
import { Share } from '../src/shares/entities/share.entity';
import { ObjectStoreService } from '../src/storage/object-store.service';
import { TakeFile } from '../src/takes/entities/take-file.entity';
import { Take } from '../src/takes/entities/take.entity';
import { Throttle } from '../src/throttle/entities/throttle.entity';
import { joined } from './support/person';
import { giveReport, shortTakeFacts } from './support/reported-take';
import { sharedBy } from './support/shares';
import { startTestApp, TestApp } from './support/test-app';

const dayMs = 24 * 60 * 60 * 1000;

describe('housekeeping', () => {
  let test: TestApp;

  beforeAll(async () => {
    test = await startTestApp();
  });
  afterAll(async () => test?.close());

  const housekeeper = (objects = test.app.get(ObjectStoreService, { strict: false })) => {
    const em = test.app.get(EntityManager);
    return new HousekeepingService(
      em,
      new TakePurge(em, objects),
      new StoreRepair(em, objects),
      new AccountPurge(em, objects),
      new ExportPurge(em, objects),
    );
  };

  it('removes takes and their recordings thirty days after they were deleted, not before', async () => {
    const juno = await joined(test);
    const [kept, gone] = [await juno.makeTake(), await juno.makeTake()];
    const next = await juno.makeTake({ followsTakeId: gone.id });
    await giveReport(test, gone, await shortTakeFacts());
    await sharedBy(juno, gone);
    await juno.delete(paths.take(gone.id)).expect(204);
    const keysOf = async (id: string) =>
      (await test.bucket.keys()).filter((key) => key.startsWith(`takes/${id}/`));
    await housekeeper().run(new Date(Date.now() + 29 * dayMs));
    expect(await keysOf(gone.id)).toHaveLength(2);
    const broken = { removeAll: () => Promise.reject(new Error('The store is away.')) };
    await housekeeper(broken as never).run(new Date(Date.now() + 31 * dayMs));
    expect(await test.em().count(Take, { id: gone.id })).toBe(1);
    await housekeeper().run(new Date(Date.now() + 31 * dayMs));
    expect(await keysOf(gone.id)).toEqual([]);
    expect(await keysOf(kept.id)).toHaveLength(2);
    for (const entity of [Measurement, Report, Share, TakeFile])
      expect(await test.em().count(entity as typeof Share, { take: gone.id })).toBe(0);
    expect(await test.em().count(Take, { owner: juno.me.id })).toBe(2);
    expect(await test.em().findOneOrFail(Take, { id: next.id })).toMatchObject({ followsTake: null });
    expect(await test.em().count(AuditEvent, { kind: 'take-purged', subjectId: gone.id })).toBe(1);
  });

  it('leaves an hour between the last moment to bring a take back and its end', async () => {
    const juno = await joined(test);
    const [late, soon] = [await juno.makeTake(), await juno.makeTake()];
    for (const { id } of [late, soon]) await juno.delete(paths.take(id)).expect(204);
    const deletedFor = (id: string, ms: number) =>
      test.em().nativeUpdate(Take, { id }, { deletedAt: new Date(Date.now() - ms) });
    await deletedFor(late.id, 30 * dayMs + 60_000);
    await deletedFor(soon.id, 30 * dayMs - 60_000);
    await housekeeper().run(new Date());
    expect(await test.em().count(Take, { id: late.id })).toBe(1);
    const deleted = listTakesResponse.parse((await juno.get(`${paths.takes}?show=deleted`)).body);
    expect([deleted.items.map(({ id }) => id), deleted.deletedTotal]).toEqual([[soon.id], 1]);
    await juno.post(paths.restoreTake(late.id)).expect(404);
    await juno.post(paths.restoreTake(soon.id)).expect(200);
    await housekeeper().run(new Date(Date.now() + 60 * 60 * 1000));
    expect(await test.em().find(Take, { owner: juno.me.id })).toMatchObject([{ id: soon.id }]);
  });

  it('removes counters a day old and sessions long over, and nothing that is in use', async () => {
    const juno = await joined(test);
    const housekeeping = housekeeper();
    await housekeeping.run(new Date());
    expect(await test.em().count(Throttle)).toBeGreaterThan(0);
    await juno.get(paths.me).expect(200);
    await housekeeping.run(new Date(Date.now() + 2 * dayMs));
    expect(await test.em().count(Throttle)).toBe(0);
    expect(await test.em().count(Session, { user: juno.me.id })).toBe(1);
    await housekeeping.run(new Date(Date.now() + 61 * dayMs));
    expect(await test.em().count(Session)).toBe(0);
  });
});
