import { paths, progressResponse, ProgressResponse } from '@thudline/contracts';
import { evennessDb, HitFacts, TakeFacts } from '@thudline/dsp';
import { Browser, joined, Person } from './support/person';
import { giveReport, shortTakeFacts } from './support/reported-take';
import { startTestApp, TestApp } from './support/test-app';

describe('a person’s progress', () => {
  let test: TestApp;
  let juno: Person;

  beforeAll(async () => {
    test = await startTestApp();
  });
  beforeEach(async () => {
    juno = await joined(test);
  });
  afterAll(async () => test?.close());

  const progressOf = async (person: Person): Promise<ProgressResponse> =>
    progressResponse.parse((await person.get(paths.progress).expect(200)).body);

  const measured = async (day: string, change: (facts: TakeFacts) => TakeFacts) => {
    const take = await juno.makeTake({ recordedAt: `${day}T19:40:00Z` });
    await giveReport(test, take, change(await shortTakeFacts()));
    return take;
  };
  const hit = (kind: HitFacts['kind'], ...peaksDbfs: (number | null)[]): HitFacts => ({
    timeS: 0,
    kind,
    peaksDbfs,
  });
  const kicks = (...peaks: number[]) => peaks.map((peakDbfs) => hit('kick', peakDbfs, -20));
  const withHits = (hits: HitFacts[]) => (facts: TakeFacts) => ({ ...facts, hits });

  it('is what every measured take tells, oldest first', async () => {
    const hits = [...kicks(-9, -10.5, -11, -8, -14, -9.2, -12), hit('kick', null, -20), hit('drum', -40, -9)];
    const balance = { drumsLufs: -20, cymbalsLufs: -18.5, differenceDb: 1.5, drumHits: 6, cymbalHits: 5 };
    const late = await measured('2026-11-20', (facts) => ({
      ...withHits(hits)(facts),
      balance: { ...balance, reason: null },
    }));
    const early = await measured('2026-10-02', withHits(kicks(-9, -9, -9)));
    await juno.makeTake({ recordedAt: '2026-11-21T19:40:00Z' });
    const { takes } = await progressOf(juno);
    expect(takes.map(({ number }) => number)).toEqual([early.number, late.number]);
    expect(takes[0]).toMatchObject({ levelSpreadDb: null, recordedAt: '2026-10-02T19:40:00.000Z' });
    expect(takes[1]).toMatchObject({ takeId: late.id, cymbalsOverDrumsDb: 1.5, clipped: false });
    expect(takes[1].levelSpreadDb).toBeCloseTo(evennessDb(hits, 0) ?? NaN, 9);
  });

  it('tells headroom of the hardest hit, and none where it clipped', async () => {
    const peak = (loudestHitDbfs: number, runCount: number) => (facts: TakeFacts) => ({
      ...facts,
      tracks: facts.tracks.map((track) => ({
        ...track,
        loudestHitDbfs,
        clipping: { ...track.clipping, runCount },
      })),
    });
    await measured('2026-10-02', peak(0, 3));
    await measured('2026-10-09', peak(-7.5, 0));
    expect((await progressOf(juno)).takes).toMatchObject([
      { headroomDb: null, clipped: true },
      { headroomDb: 7.5, clipped: false },
    ]);
  });

  it('is nobody else’s, leaves deleted takes out, and needs signing in', async () => {
    const take = await measured('2026-10-02', withHits([]));
    expect((await progressOf(await joined(test, 'Oda'))).takes).toEqual([]);
    await juno.delete(paths.take(take.id)).expect(204);
    expect((await progressOf(juno)).takes).toEqual([]);
    await new Browser(test).get(paths.progress).expect(401);
  });
});
