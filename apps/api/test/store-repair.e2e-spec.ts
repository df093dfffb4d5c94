import { EntityManager } from '@mikro-orm/postgresql';
import { StoreRepair } from '../src/housekeeping/store-repair';
import { ObjectStoreService } from '../src/storage/object-store.service';
import { TakeFile } from '../src/takes/entities/take-file.entity';
import { joined } from './support/person';
import { giveReport, shortTakeFacts } from './support/reported-take';
import { startTestApp, TestApp } from './support/test-app';

const hourMs = 60 * 60 * 1000;
const inHours = (hours: number) => new Date(Date.now() + hours * hourMs);

describe('the repair of the object store', () => {
  let test: TestApp;
  let repair: StoreRepair;

  beforeAll(async () => {
    test = await startTestApp();
    repair = new StoreRepair(
      test.app.get(EntityManager),
      test.app.get(ObjectStoreService, { strict: false }),
    );
  });
  afterAll(async () => test?.close());

  it('removes what no row stands on once it is a day old, and nothing else', async () => {
    const juno = await joined(test);
    const take = await juno.makeTake();
    await giveReport(test, take, await shortTakeFacts());
    const orphans = [`takes/${take.id}/left-by-a-crash.wav`, 'photos/left-by-a-crash.jpg'];
    for (const key of [...orphans, 'elsewhere/kept.bin']) await test.bucket.overwrite(key, new Uint8Array(4));
    const before = await test.bucket.keys();
    expect(await repair.run({ now: inHours(23) })).toMatchObject({ objects: before.length, removed: 0 });
    expect(await repair.run({ now: inHours(25) })).toMatchObject({ removed: 2 });
    expect(await test.bucket.keys()).toEqual(before.filter((key) => !orphans.includes(key)));
    expect(await repair.run({ now: inHours(25) })).toMatchObject({ removed: 0 });
  });

  it('tells a recording that is gone, and only that one', async () => {
    const juno = await joined(test);
    const [whole, hurt] = [await juno.makeTake(), await juno.makeTake()];
    const [file] = await test.em().find(TakeFile, { take: hurt.id }, { orderBy: { position: 'asc' } });
    const known = (await repair.run({ now: new Date() })).missing;
    await test.app.get(ObjectStoreService, { strict: false }).removeAll(file.objectKey);
    const { missing } = await repair.run({ now: new Date() });
    expect(missing.filter((key) => !known.includes(key))).toEqual([file.objectKey]);
    expect(missing.some((key) => key.includes(whole.id))).toBe(false);
  });
});
