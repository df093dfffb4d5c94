import { EntityManager } from '@mikro-orm/postgresql';
import { paths } from '@thudline/contracts';
import { SessionsService } from '../src/auth/sessions.service';
import { OneTimeTokenKind } from '../src/tokens/entities/one-time-token.entity';
import { OneTimeTokensService } from '../src/tokens/one-time-tokens.service';
import { User } from '../src/users/entities/user.entity';
import { Browser, joined, Person, rightPassword } from './support/person';
import { startTestApp, TestApp } from './support/test-app';

const password = 'another battery staple';

describe('a password that changes', () => {
  let test: TestApp;
  let juno: Person;

  beforeAll(async () => {
    test = await startTestApp();
  });
  beforeEach(async () => {
    juno = await joined(test);
  });
  afterEach(() => jest.restoreAllMocks());
  afterAll(async () => test?.close());

  const linkFor = async (person: Person, kind: OneTimeTokenKind) => {
    const em = test.app.get(EntityManager).fork();
    const user = await em.findOneOrFail(User, { id: person.me.id });
    return (await new OneTimeTokensService(em).make(kind, user)).token;
  };
  const signIn = (person: Person, tried: string) =>
    new Browser(test).post(paths.signIn, { email: person.me.email, password: tried });
  const change = (person: Person) =>
    person.post(paths.changePassword, { oldPassword: rightPassword, password });
  const breakSessions = () => {
    const sessions = test.app.get(SessionsService, { strict: false });
    jest.spyOn(sessions, 'endAll').mockRejectedValueOnce(new Error('The database went away.'));
  };

  it('uses up the links to another password and to the phone that were open', async () => {
    const [reset, phone] = [await linkFor(juno, 'reset'), await linkFor(juno, 'phone')];
    await change(juno).expect(204);
    await new Browser(test).post(paths.reset, { token: reset, password: 'a third password' }).expect(410);
    await new Browser(test).post(paths.openPhoneLink, { token: phone }).expect(410);
    await signIn(juno, password).expect(200);
  });

  it('stays as it was when the sessions can’t be ended', async () => {
    const phone = await linkFor(juno, 'phone');
    breakSessions();
    await change(juno).expect(500);
    await signIn(juno, password).expect(401);
    await signIn(juno, rightPassword).expect(200);
    await new Browser(test).post(paths.openPhoneLink, { token: phone }).expect(200);
  });

  it('stays as it was when a reset can’t end the sessions, and its link still works', async () => {
    const token = await linkFor(juno, 'reset');
    breakSessions();
    await new Browser(test).post(paths.reset, { token, password }).expect(500);
    await signIn(juno, rightPassword).expect(200);
    await new Browser(test).post(paths.reset, { token, password }).expect(204);
    await signIn(juno, password).expect(200);
    await juno.get(paths.me).expect(401);
  });
});
