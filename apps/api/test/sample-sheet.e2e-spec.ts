import { execFile } from 'node:child_process';
import { resolve } from 'node:path';
import { promisify } from 'node:util';
import { paths, TakeResponse } from '@thudline/contracts';
import { Browser, joined, Person } from './support/person';
import { giveReport, shortTakeFacts } from './support/reported-take';
import { startTestApp, TestApp } from './support/test-app';
import { testEnvironment } from './support/test-config';

const run = promisify(execFile);

describe('the sample sheet', () => {
  let test: TestApp;
  let juno: Person;
  let take: TakeResponse;

  beforeAll(async () => {
    test = await startTestApp();
    juno = await joined(test);
    take = await juno.makeTake();
  });
  afterAll(async () => test?.close());

  /** As the start command does it, in a process of its own. */
  const choose = (takeId: string) =>
    run(process.execPath, [resolve(__dirname, '../dist/sample-take.js'), takeId], {
      env: testEnvironment(test.database.url),
    });
  const sample = async () => (await new Browser(test).get(paths.sampleSheet).expect(200)).body as object;

  it('is none until one is chosen, and only a measured take can be', async () => {
    expect(await sample()).toEqual({ takeId: null });
    await expect(choose('nonsense')).rejects.toThrow('Say which take');
    await expect(choose(take.id)).rejects.toThrow('There is no measured take');
    expect(await sample()).toEqual({ takeId: null });
  });

  it('is read and heard by anyone, and by nobody changed or downloaded', async () => {
    await giveReport(test, take, await shortTakeFacts());
    await choose(take.id);
    await choose(take.id);
    expect(await sample()).toEqual({ takeId: take.id });
    for (const anyone of [new Browser(test), await joined(test, 'Oda')]) {
      const seen = await anyone.get(paths.take(take.id)).expect(200);
      expect(seen.body).toMatchObject({ rights: { change: false, listen: true, download: false } });
      await anyone.get(paths.report(take.id)).expect(200);
      await anyone.get(paths.listen(take.id)).expect(200);
      await anyone.get(paths.takeFile(take.id, take.files[0].id)).expect(403);
      await anyone.patch(paths.take(take.id), { title: 'Mine' }).expect(403);
    }
    await new Browser(test).get(paths.take((await juno.makeTake()).id)).expect(401);
  });

  it('is none again once its take is deleted', async () => {
    await juno.delete(paths.take(take.id)).expect(204);
    expect(await sample()).toEqual({ takeId: null });
    await new Browser(test).get(paths.take(take.id)).expect(401);
  });
});
