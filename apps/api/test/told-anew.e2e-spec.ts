import { defaultUserSettings, paths, UserSettings } from '@thudline/contracts';
import { TakeFacts } from '@thudline/dsp';
import { Report } from '../src/reports/entities/report.entity';
import { toldColumns } from '../src/reports/reports.mapper';
import { joined, Person } from './support/person';
import { giveReport, shortTakeFacts } from './support/reported-take';
import { startTestApp, TestApp } from './support/test-app';

/** A clipped hit, which the words count. */
function clipped(facts: TakeFacts): TakeFacts {
  const [kick, overhead] = facts.tracks;
  const runs = [{ startSample: 480, lengthSamples: 4, levelDbfs: 0 }];
  const hits = [{ ...facts.hits[0], timeS: 0.005, kind: 'kick', peaksDbfs: [0, -9] }] as TakeFacts['hits'];
  return {
    ...facts,
    hits,
    tracks: [{ ...kick, clipping: { runs, runCount: 1, clippedSamples: 4 } }, overhead],
  };
}

describe('what sheets say', () => {
  let test: TestApp;
  let juno: Person;

  beforeAll(async () => {
    test = await startTestApp();
  });
  beforeEach(async () => {
    juno = await joined(test);
  });
  afterAll(async () => test?.close());

  const stale = 'as it was told before';
  const saidAfter = async (settings: Partial<UserSettings>, facts: TakeFacts) => {
    const take = await juno.makeTake();
    await giveReport(test, take, facts);
    await test.em().nativeUpdate(Report, { take: take.id }, { says: stale });
    await juno.patch(paths.me, { settings }).expect(200);
    return (await test.em().findOneOrFail(Report, { take: take.id })).says;
  };

  it.each<Partial<UserSettings>>([
    { lengthUnit: 'foot' },
    { temperatureC: 30 },
    { target: { lowDbfs: -20, highDbfs: -14, aimDbfs: -16 } },
  ])('is told anew after %j', async (settings) => {
    const facts = await shortTakeFacts();
    const expected = toldColumns(facts, { ...defaultUserSettings, ...settings }).says;
    expect(await saidAfter(settings, facts)).toBe(expected);
  });

  it('counts the hits of a clipped take as it did when it was measured', async () => {
    const facts = clipped(await shortTakeFacts());
    const said = await saidAfter({ lengthUnit: 'foot' }, facts);
    expect(said).toContain('One kick hit is flattened');
    expect(said).toBe(toldColumns(facts, { ...defaultUserSettings, lengthUnit: 'foot' }).says);
  });

  it('stays where nothing that is told has changed', async () => {
    expect(await saidAfter({ singleKeys: false }, await shortTakeFacts())).toBe(stale);
  });
});

it('settings that two tabs change at the same moment are both kept', async () => {
  const test = await startTestApp();
  try {
    const juno = await joined(test);
    const changes: Partial<UserSettings>[] = [
      { lengthUnit: 'foot' },
      { temperatureC: 30 },
      { singleKeys: false },
      { temperatureUnit: 'fahrenheit' },
    ];
    await Promise.all(changes.map((settings) => juno.patch(paths.me, { settings }).expect(200)));
    const settings = changes.reduce((all, change) => ({ ...all, ...change }), defaultUserSettings);
    expect((await juno.get(paths.me)).body).toMatchObject({ settings });
  } finally {
    await test.close();
  }
});
