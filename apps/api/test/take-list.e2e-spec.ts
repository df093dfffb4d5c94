import { randomUUID } from 'node:crypto';
import { listTakesResponse, ListTakesResponse, paths, TakeResponse } from '@thudline/contracts';
import { TakeFacts, TrackFacts } from '@thudline/dsp';
import { joined, Person } from './support/person';
import { giveReport, shortTakeFacts } from './support/reported-take';
import { startTestApp, TestApp } from './support/test-app';

type Verdict = TakeFacts['pairs'][number]['agreement']['verdict'];

interface Case {
  title: string;
  kickDbfs: number;
  overheadDbfs?: number;
  noiseDbfs?: number;
  clipped?: boolean;
  verdict?: Verdict;
  lowEndDb?: number;
  overhead?: Partial<TrackFacts>;
}

/** One take for each thing a list can say. */
const cases: Case[] = [
  { title: 'good', kickDbfs: -9 },
  { title: 'hot', kickDbfs: -2, lowEndDb: 1 },
  { title: 'a little low', kickDbfs: -14 },
  { title: 'far too low', kickDbfs: -25 },
  { title: 'low over noise', kickDbfs: -14, noiseDbfs: -62 },
  { title: 'noisy', kickDbfs: -9, noiseDbfs: -50 },
  { title: 'clipped', kickDbfs: 0, clipped: true },
  { title: 'opposite', kickDbfs: -9, overheadDbfs: -8, verdict: 'flip', lowEndDb: -3 },
  { title: 'unclear', kickDbfs: -9, verdict: 'cannot-tell' },
  { title: 'overhead hot', kickDbfs: -9, overheadDbfs: -1 },
  { title: 'humming', kickDbfs: -9, overhead: { hum: { mainsHz: 50, levelDbfs: -62 } } },
  { title: 'broken', kickDbfs: -9, overhead: { dropouts: { count: 2, firstAtS: 0.1 } } },
  { title: 'squashed', kickDbfs: -9, overhead: { looksFlattened: true } },
  { title: 'off centre', kickDbfs: -9, overhead: { dcOffset: 0.02 } },
];

describe('the sentence above the list', () => {
  let test: TestApp;
  let juno: Person;
  const made = new Map<string, TakeResponse>();

  beforeAll(async () => {
    test = await startTestApp();
    juno = await joined(test);
    const facts = await shortTakeFacts();
    for (const each of cases) {
      const take = await juno.makeTake({ title: each.title });
      await giveReport(test, take, factsOf(facts, each));
      made.set(each.title, take);
    }
    const bare = await juno.makeTake({
      title: 'waiting',
      note: '100 % felt_beater',
      tags: ['felt', 'kit B'],
    });
    made.set('waiting', bare);
  });
  afterAll(async () => test?.close());

  const list = async (query: Record<string, string | number> = {}): Promise<ListTakesResponse> => {
    const response = await juno
      .get(paths.takes)
      .query({ limit: 100, ...query })
      .expect(200);
    return listTakesResponse.parse(response.body);
  };
  const titles = async (query: Record<string, string | number>) =>
    (await list(query)).items.map(({ title }) => title).sort();

  it('shows as good exactly the takes it says a good word of', async () => {
    const { items } = await list();
    const said = items.filter(({ summary }) => summary?.status === 'good').map(({ title }) => title);
    expect(said.sort()).toEqual(['a little low', 'good', 'off centre']);
    expect(await titles({ show: 'good' })).toEqual(said);
  });

  it('shows takes by level, by polarity and by what could not be told', async () => {
    expect(await titles({ show: 'clipped' })).toEqual(['clipped']);
    expect(await titles({ show: 'hot' })).toEqual(['hot', 'overhead hot']);
    expect(await titles({ show: 'low' })).toEqual(['a little low', 'far too low', 'low over noise']);
    expect(await titles({ show: 'to-flip' })).toEqual(['opposite']);
    expect(await titles({ show: 'cannot-tell' })).toEqual(['unclear']);
  });

  it('shows takes by what a finding asks about', async () => {
    expect(await titles({ show: 'hum' })).toEqual(['humming']);
    expect(await titles({ show: 'dropouts' })).toEqual(['broken']);
    expect(await titles({ show: 'flattened' })).toEqual(['squashed']);
    expect(await titles({ show: 'dc-offset' })).toEqual(['off centre']);
    expect(await titles({ show: 'noise' })).toEqual(['noisy']);
    for (const show of ['overs', 'late-start', 'balance', 'files'])
      expect(await titles({ show })).toEqual([]);
    // No arrival can be told from the few kicks of a take this short.
    expect(await titles({ show: 'arrival' })).toHaveLength(cases.length);
  });

  it('follows the target as soon as it is another', async () => {
    await juno
      .patch(paths.me, { settings: { target: { lowDbfs: -6, highDbfs: -1, aimDbfs: -3 } } })
      .expect(200);
    expect(await titles({ show: 'hot' })).toEqual([]);
    expect(await titles({ find: 'LOW' })).toContain('far too low');
    expect(await titles({ find: 'hot.' })).toEqual([]);
    await juno.patch(paths.me, { settings: { target: juno.me.settings.target } }).expect(200);
    expect(await titles({ find: 'hot.' })).toEqual(['hot', 'overhead hot']);
  });

  it('sorts by the hardest kick and by the fullest low end; what has none stands last', async () => {
    const byKick = (await list({ order: 'hardest-kick' })).items;
    expect(byKick.slice(0, 2).map(({ title }) => title)).toEqual(['clipped', 'hot']);
    expect(byKick.at(-1)?.title).toBe('waiting');
    const byLowEnd = (await list({ order: 'fullest-low-end' })).items;
    expect(byLowEnd[0].title).toBe('hot');
    expect(byLowEnd.at(-1)?.title).toBe('waiting');
    expect(byLowEnd.at(-2)?.title).toBe('opposite');
  });

  it('pages in every order without losing or repeating a take', async () => {
    for (const order of ['newest', 'oldest', 'hardest-kick', 'fullest-low-end']) {
      const whole = (await list({ order })).items.map(({ id }) => id);
      const seen: string[] = [];
      let cursor: string | null = null;
      do {
        const page: ListTakesResponse = await list({ order, limit: 3, ...(cursor ? { cursor } : {}) });
        expect(page.total).toBe(made.size);
        seen.push(...page.items.map(({ id }) => id));
        ({ nextCursor: cursor } = page);
      } while (cursor);
      expect([order, seen]).toEqual([order, whole]);
    }
  });

  it('finds words of the title, the note and what the sheet says, letter by letter', async () => {
    expect(await titles({ find: 'FELT_beater 100' })).toEqual(['waiting']);
    expect(await titles({ find: '%' })).toEqual(['waiting']);
    expect(await titles({ find: 'felt nowhere' })).toEqual([]);
    expect(await titles({ find: 'flip the overhead' })).toEqual(['opposite']);
  });

  it('tells every tag in use and shows the takes of one', async () => {
    const take = made.get('good')!;
    await juno.patch(paths.take(take.id), { tags: ['kit B', 'Attic', 'kit B'] }).expect(200);
    const { tags } = await list();
    expect(tags).toEqual(['Attic', 'felt', 'kit B']);
    expect(await titles({ tag: 'kit B' })).toEqual(['good', 'waiting']);
    expect(await titles({ tag: 'nobody uses this' })).toEqual([]);
    await juno.patch(paths.take(take.id), { tags: ['one, two'] }).expect(400);
    await juno.patch(paths.take(take.id), { tags: [] }).expect(200);
  });

  it('counts what fits, what there is, and what was deleted', async () => {
    const gone = await juno.makeTake({ title: 'gone', tags: ['gone'] });
    await juno.delete(paths.take(gone.id)).expect(204);
    const { items, total, everyTotal, deletedTotal, tags } = await list({ show: 'hot' });
    expect([items.length, total, everyTotal, deletedTotal]).toEqual([2, 2, made.size, 1]);
    expect(tags).not.toContain('gone');
    const deleted = await list({ show: 'deleted' });
    expect(deleted.items).toMatchObject([{ title: 'gone', deletedAt: expect.any(String) as string }]);
  });

  it('refuses words it does not know', async () => {
    await juno.get(`${paths.takes}?show=everything`).expect(400);
    await juno.get(`${paths.takes}?order=loudest`).expect(400);
  });
});

describe('a take that follows another', () => {
  let test: TestApp;
  beforeAll(async () => {
    test = await startTestApp();
  });
  afterAll(async () => test?.close());

  it('says which, and the earlier one says which came after', async () => {
    const juno = await joined(test);
    const before = await juno.makeTake({ title: 'before' });
    const after = await juno.makeTake({ followsTakeId: before.id, doneActions: ['flip-overhead'] });
    expect(after.follows).toEqual({ id: before.id, number: before.number, title: 'before' });
    const read = (await juno.get(paths.take(before.id))).body as TakeResponse;
    expect(read.followedBy).toEqual({ id: after.id, number: after.number });
    expect(read.follows).toBeNull();
    await juno.delete(paths.take(before.id)).expect(204);
    expect(((await juno.get(paths.take(after.id))).body as TakeResponse).follows).toBeNull();
  });

  it('is refused where the earlier one is not the player’s own, before anything is stored', async () => {
    const juno = await joined(test);
    const others = await (await joined(test, 'Oda')).makeTake();
    for (const followsTakeId of [others.id, randomUUID()]) {
      await expect(juno.makeTake({ followsTakeId })).rejects.toThrow('not there any more');
    }
    expect((await juno.get(paths.takes)).body).toMatchObject({ total: 0 });
  });
});

function factsOf(facts: TakeFacts, each: Case): TakeFacts {
  const track = (base: TrackFacts, peakDbfs: number, isClipped: boolean): TrackFacts => ({
    ...base,
    // A take this short lies off its centre.
    dcOffset: 0,
    loudestHitDbfs: peakDbfs,
    noiseFloorDbfs: each.noiseDbfs ?? -80,
    noiseFloorReason: null,
    clipping: isClipped
      ? { runs: [{ startSample: 1, lengthSamples: 4, levelDbfs: 0 }], runCount: 1, clippedSamples: 4 }
      : { runs: [], runCount: 0, clippedSamples: 0 },
  });
  const [kick, overhead] = facts.tracks;
  const [pair] = facts.pairs;
  const verdict = each.verdict ?? 'keep';
  return {
    ...facts,
    tracks: [
      track(kick, each.kickDbfs, each.clipped ?? false),
      { ...track(overhead, each.overheadDbfs ?? -9, false), ...each.overhead },
    ],
    pairs: [
      {
        ...pair,
        agreement: {
          ...pair.agreement,
          verdict,
          sure: true,
          reason: verdict === 'cannot-tell' ? 'hits-disagree' : null,
          hitsUsed: 8,
          agreeingHits: 8,
          flipGainMatchedDb: verdict === 'flip' ? 2 : -2,
          choices: [
            { name: 'as-recorded', flipped: false, shiftMs: 0, lowEndDb: each.lowEndDb ?? 0, deepest: null },
          ],
        },
      },
    ],
  };
}
