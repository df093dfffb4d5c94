import { randomUUID } from 'node:crypto';
import { EntityManager } from '@mikro-orm/postgresql';
import { TakeResponse } from '@thudline/contracts';
import { ObjectStoreService } from '../src/storage/object-store.service';
import { Take } from '../src/takes/entities/take.entity';
import { joined, Person } from './support/person';
import { shortTake } from './support/recordings';
import { startTestApp, TestApp } from './support/test-app';

describe('an upload that fails on the way', () => {
  let test: TestApp;
  let juno: Person;
  let keysBefore: string[];

  beforeAll(async () => {
    test = await startTestApp();
  });
  beforeEach(async () => {
    juno = await joined(test);
    keysBefore = await test.bucket.keys();
  });
  afterEach(() => jest.restoreAllMocks());
  afterAll(async () => test?.close());

  const newKeys = async () => (await test.bucket.keys()).filter((key) => !keysBefore.includes(key));
  /** What happens once where a transaction would be committed. */
  const atCommit = (happens: (commit: () => Promise<void>) => Promise<void>) => {
    const connection = test.app.get(EntityManager).getConnection();
    const commit = connection.commit.bind(connection);
    jest.spyOn(connection, 'commit').mockImplementationOnce((...args) => happens(() => commit(...args)));
  };

  it('leaves nothing behind, also of the file that was still on its way', async () => {
    const objects = test.app.get(ObjectStoreService, { strict: false });
    jest.spyOn(objects, 'putVerified').mockRejectedValueOnce(new Error('The store went away.'));
    await juno.upload(shortTake()).expect(500);
    expect(await newKeys()).toEqual([]);
  });

  it('keeps the take whose rows were written before the connection was lost', async () => {
    atCommit(async (commit) => {
      await commit();
      throw new Error('Connection terminated unexpectedly');
    });
    const uploadKey = randomUUID();
    const first = await juno.upload({ ...shortTake(), uploadKey }).expect(201);
    const again = await juno.upload({ ...shortTake(), uploadKey }).expect(200);
    expect((again.body as TakeResponse).id).toBe((first.body as TakeResponse).id);
    expect(await newKeys()).toHaveLength(2);
  });

  it('leaves nothing behind when the rows were not written', async () => {
    atCommit(() => Promise.reject(new Error('Connection terminated unexpectedly')));
    await juno.upload(shortTake()).expect(500);
    expect(await test.em().count(Take, { owner: juno.me.id })).toBe(0);
    expect(await newKeys()).toEqual([]);
  });
});
