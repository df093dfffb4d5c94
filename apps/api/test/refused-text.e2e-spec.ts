import { errorResponse, paths, TakeResponse } from '@thudline/contracts';
import { joined, Person } from './support/person';
import { shortTake } from './support/recordings';
import { startTestApp, TestApp } from './support/test-app';

const [nul, half] = ['a\u0000b', 'a\ud800b'];

describe('what the database can’t keep is refused in a sentence', () => {
  let test: TestApp;
  let juno: Person;
  let take: TakeResponse;

  beforeAll(async () => {
    test = await startTestApp();
    juno = await joined(test);
    take = await juno.makeTake();
  });
  afterAll(async () => test?.close());

  const refused = async (request: PromiseLike<{ status: number; body: unknown }>, field?: string) => {
    const { status, body } = await request;
    expect([status, body]).toMatchObject([400, { code: 'bad-request' }]);
    const { details } = errorResponse.parse(body);
    if (field) expect(Object.keys(details?.fields ?? {})).toEqual([expect.stringMatching(field)]);
  };

  it.each([nul, half])('in a take: %j', async (text) => {
    await refused(juno.patch(paths.take(take.id), { title: text }), '^title');
    await refused(juno.patch(paths.take(take.id), { note: text }), '^note');
    await refused(juno.patch(paths.take(take.id), { tags: [text] }), '^tags');
    await refused(juno.patch(paths.take(take.id), { tickedActions: [text] }), '^tickedActions');
    await refused(juno.upload({ ...shortTake(), doneActions: [text] }), '^doneActions');
    await refused(juno.upload({ ...shortTake(), tags: [text] }), '^tags');
  });

  it.each([nul, half])('in a name and in a question: %j', async (text) => {
    await refused(juno.patch(paths.me, { name: text }), '^name');
    await refused(
      juno.post(paths.shares, { subject: { kind: 'take', takeId: take.id }, question: text }),
      '^question',
    );
  });

  it('in what a list is asked for', async () => {
    await refused(juno.get(`${paths.takes}?find=a%00b`), '^find');
    await refused(juno.get(`${paths.takes}?tag=a%00b`), '^tag');
    for (const place of [1e300, -1e300]) {
      const cursor = Buffer.from(JSON.stringify([place, take.id])).toString('base64url');
      await refused(juno.get(`${paths.takes}?cursor=${cursor}`));
    }
  });

  it('in the day a take was recorded', async () => {
    const nextWeek = new Date(Date.now() + 7 * 24 * 60 * 60 * 1000).toISOString();
    for (const recordedAt of ['0000-01-01T00:00:00Z', '1969-12-31T23:00:00Z', nextWeek])
      await refused(juno.upload({ ...shortTake(), recordedAt }), '^recordedAt');
    await juno.makeTake({ recordedAt: new Date(Date.now() + 60 * 60 * 1000).toISOString() });
  });

  it('and lines in a note are kept', async () => {
    const note = 'beater: felt\n\thead: loose';
    const changed = await juno.patch(paths.take(take.id), { note }).expect(200);
    expect(changed.body).toMatchObject({ note });
  });
});
