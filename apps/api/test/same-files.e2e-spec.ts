import { paths, sameFilesResponse, TakeResponse } from '@thudline/contracts';
import { Browser, joined, Person } from './support/person';
import { startTestApp, TestApp } from './support/test-app';

describe('files that were sent before', () => {
  let test: TestApp;
  let juno: Person;
  let oda: Person;
  let take: TakeResponse;

  beforeAll(async () => {
    test = await startTestApp();
    juno = await joined(test);
    oda = await joined(test, 'Oda');
  });
  beforeEach(async () => {
    take = await juno.makeTake({ title: 'felt beater' });
  });
  afterAll(async () => test?.close());

  const hashes = () => take.files.map(({ sha256 }) => sha256);
  const same = async (sha256: string[], who: Person = juno) => {
    const answer = await who.get(`${paths.sameFiles}?sha256=${sha256.join(',')}`).expect(200);
    return sameFilesResponse.parse(answer.body).items;
  };

  it('are told with the newest take they are in; new ones are not', async () => {
    const newest = { id: take.id, number: take.number, title: 'felt beater' };
    const found = await same([...hashes(), 'ab'.repeat(32)]);
    expect(found.map((item) => item.sha256).sort()).toEqual(hashes().sort());
    expect(found.map((item) => item.take)).toEqual([newest, newest]);
  });

  it('are forgotten with deleted takes, and nobody else’s business', async () => {
    expect(await same(hashes(), oda)).toEqual([]);
    await juno.delete(paths.take(take.id)).expect(204);
    expect((await same(hashes())).map((item) => item.take.id)).not.toContain(take.id);
    await new Browser(test).get(`${paths.sameFiles}?sha256=${hashes()[0]}`).expect(401);
  });

  it('are named by their SHA-256, in one sentence where they are not', async () => {
    for (const query of ['', '?sha256=kick.wav', `?sha256=${Array(11).fill('ab'.repeat(32)).join(',')}`]) {
      await juno.get(`${paths.sameFiles}${query}`).expect(400);
    }
    const refused = await juno.get(`${paths.sameFiles}?sha256=kick.wav`).expect(400);
    expect(refused.body).toMatchObject({
      message: 'Name one to ten files by their SHA-256, with commas between.',
    });
  });
});
