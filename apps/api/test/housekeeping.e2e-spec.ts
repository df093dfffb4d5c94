import { EntityManager } from '@mikro-orm/postgresql';
import { paths } from '@thudline/contracts';
import { Session } from '../src/auth/entities/session.entity';
import { HousekeepingService } from '../src/housekeeping/housekeeping.service';
import { Throttle } from '../src/throttle/entities/throttle.entity';
import { joined } from './support/person';
import { startTestApp, TestApp } from './support/test-app';

const dayMs = 24 * 60 * 60 * 1000;

describe('housekeeping', () => {
  let test: TestApp;

  beforeAll(async () => {
    test = await startTestApp();
  });
  afterAll(async () => test?.close());

  it('removes counters a day old and sessions long over, and nothing that is in use', async () => {
    const juno = await joined(test);
    const housekeeping = new HousekeepingService(test.app.get(EntityManager));
    await housekeeping.run(new Date());
    expect(await test.em().count(Throttle)).toBe(1);
    await juno.get(paths.me).expect(200);
    await housekeeping.run(new Date(Date.now() + 2 * dayMs));
    expect(await test.em().count(Throttle)).toBe(0);
    expect(await test.em().count(Session)).toBe(1);
    await housekeeping.run(new Date(Date.now() + 61 * dayMs));
    expect(await test.em().count(Session)).toBe(0);
  });
});
