import { defaultUserSettings, meResponse, paths } from '@thudline/contracts';
import { User } from '../src/users/entities/user.entity';
import { joined } from './support/person';
import { startTestApp, TestApp } from './support/test-app';

describe('me', () => {
  let test: TestApp;

  beforeAll(async () => {
    test = await startTestApp();
  });
  afterAll(async () => test?.close());

  it('changes what is named and leaves the rest', async () => {
    const juno = await joined(test);
    const changed = await juno
      .patch(paths.me, { settings: { lengthUnit: 'foot', singleKeys: false } })
      .expect(200);
    expect(meResponse.parse(changed.body)).toEqual({
      ...juno.me,
      settings: { ...defaultUserSettings, lengthUnit: 'foot', singleKeys: false },
    });
    const renamed = await juno.patch(paths.me, { name: ' Juno L. ' }).expect(200);
    expect(renamed.body).toMatchObject({ name: 'Juno L.', settings: { lengthUnit: 'foot' } });
    expect((await juno.get(paths.me)).body).toEqual(renamed.body);
  });

  it('refuses an aim that does not lie within the target', async () => {
    const juno = await joined(test);
    const target = { lowDbfs: -12, highDbfs: -6, aimDbfs: -3 };
    await juno.patch(paths.me, { settings: { target } }).expect(400);
    expect((await juno.get(paths.me)).body).toEqual(juno.me);
  });

  it('gives settings that an older row lacks their defaults', async () => {
    const juno = await joined(test);
    const { lengthUnit, temperatureUnit, temperatureC, target } = defaultUserSettings;
    const older = { lengthUnit, temperatureUnit, temperatureC, target };
    await test.em().nativeUpdate(User, { id: juno.me.id }, { settings: older });
    expect((await juno.get(paths.me).expect(200)).body).toEqual(juno.me);
  });
});
