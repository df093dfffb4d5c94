import { randomUUID } from 'node:crypto';
import { paths } from '@thudline/contracts';
import { openApiDocument } from '../src/open-api/open-api';
import { Browser, joined, Person } from './support/person';
import { openedBy, sharedBy } from './support/shares';
import { startTestApp, TestApp } from './support/test-app';

interface Route {
  method: string;
  path: string;
}

/** What the running server routes, from the router itself; not from anything written beside it. */
function routesOf({ app }: TestApp): Route[] {
  const { router } = app.getHttpAdapter().getInstance() as {
    router: { stack: { route?: { path: string; methods: Record<string, boolean> } }[] };
  };
  return router.stack.flatMap(({ route }) =>
    route ? Object.keys(route.methods).map((method) => ({ method, path: route.path })) : [],
  );
}

/** Open to anyone on purpose. A route that isn't named here must ask who is there. */
const openToAnyone = new Set([
  `post ${paths.join}`,
  `post ${paths.signIn}`,
  `post ${paths.refresh}`,
  `post ${paths.signOut}`,
  `get ${paths.health}`,
  `post ${paths.forgot}`,
  `post ${paths.reset}`,
  `post ${paths.verify}`,
  `post ${paths.confirmEmail}`,
  `post ${paths.readMailChoice}`,
  `post ${paths.mailChoice}`,
  `post ${paths.stopMail}`,
  `post ${paths.openPhoneLink}`,
  `post ${paths.openShare}`,
  `get ${paths.sampleSheet}`,
  `get ${paths.signUp}`,
]);
const isDocumentation = ({ path }: Route) => path.startsWith(paths.docs);
/** How Nest hangs middleware (logging, the identity map) into the router: it passes every request on. */
const isMiddleware = ({ path }: Route) => ['/{*path}', '/{*all}'].includes(path);

describe('every route there is', () => {
  let test: TestApp;
  let juno: Person;
  let oda: Person;
  let routes: Route[];

  beforeAll(async () => {
    test = await startTestApp();
    juno = await joined(test, 'Juno');
    oda = await joined(test, 'Oda');
    routes = routesOf(test).filter((route) => !isDocumentation(route) && !isMiddleware(route));
  });
  afterAll(async () => test?.close());

  const send = (browser: Browser, { method, path }: Route) => {
    switch (method) {
      case 'get':
        return browser.get(path);
      case 'post':
        return browser.post(path, {});
      case 'patch':
        return browser.patch(path, {});
      case 'delete':
        return browser.delete(path);
      default:
        throw new Error(`A route answers to ${method}; teach this test how to send it.`);
    }
  };
  const filled = (route: Route, takeId: string, fileId: string) => ({
    ...route,
    path: route.path.replace(':id', takeId).replace(':otherId', takeId).replace(':fileId', fileId),
  });
  const takeRoutes = () => routes.filter((route) => route.path.startsWith(`${paths.takes}/:id`));

  it('is found by this test', () => {
    const found = routes.map(({ method, path }) => `${method} ${path}`);
    expect(found).toEqual(expect.arrayContaining([...openToAnyone]));
    expect(takeRoutes().length).toBeGreaterThanOrEqual(10);
    for (const path of [paths.takes, paths.me, paths.take(':id'), paths.report(':id'), paths.listen(':id')]) {
      expect(found).toContain(`get ${path}`);
    }
  });

  it('answers 401 to somebody signed out, unless it is open on purpose', async () => {
    const take = await juno.makeTake();
    for (const route of routes.filter(({ method, path }) => !openToAnyone.has(`${method} ${path}`))) {
      const response = await send(new Browser(test), filled(route, take.id, take.files[0].id));
      expect([route, response.status, response.body]).toEqual([
        route,
        401,
        { code: 'not-signed-in', message: 'Sign in to go on.' },
      ]);
    }
  });

  it('of a take answers 404 to another player, as if there were no such take', async () => {
    const take = await juno.makeTake();
    for (const route of takeRoutes()) {
      const others = await send(oda, filled(route, take.id, take.files[0].id));
      const none = await send(oda, filled(route, randomUUID(), randomUUID()));
      const malformed = await send(oda, filled(route, 'nonsense', 'nonsense'));
      expect([route, others.status, none.status, malformed.status]).toEqual([route, 404, 404, 404]);
      expect([route, others.body]).toEqual([route, none.body]);
    }
    await juno.get(paths.take(take.id)).expect(200);
  });

  it('of a take answers 404 to a guest who opened a link to another take', async () => {
    const [shown, hidden] = [await juno.makeTake(), await juno.makeTake()];
    const guest = new Browser(test);
    await openedBy(guest, await sharedBy(juno, shown, { canDownload: true }));
    for (const route of takeRoutes()) {
      const response = await send(guest, filled(route, hidden.id, hidden.files[0].id));
      expect([route, response.status]).toEqual([route, 404]);
    }
    await guest.get(paths.take(shown.id)).expect(200);
  });

  it('that a guest with every permission may call only reads, or is for notes and complaints', async () => {
    const take = await juno.makeTake();
    const guest = new Browser(test);
    await openedBy(guest, await sharedBy(juno, take, { canDownload: true, canNote: true }));
    const open: string[] = [];
    for (const route of routes.filter(({ method, path }) => !openToAnyone.has(`${method} ${path}`))) {
      const response = await send(guest, filled(route, take.id, take.files[0].id));
      const isClosed =
        [401, 403].includes(response.status) || (response.body as { code?: string }).code === 'not-found';
      if (!isClosed) open.push(`${route.method} ${route.path}`);
    }
    const reading = [
      paths.take(':id'),
      paths.report(':id'),
      paths.pairSpectrum(':id'),
      paths.comparison(':id', ':otherId'),
      paths.excerpt(':id'),
      paths.peaks(':id'),
      paths.listen(':id'),
      paths.takeFile(':id', ':fileId'),
      paths.addedFiles(':id'),
      paths.notes(':id'),
    ].map((path) => `get ${path}`);
    // What is read is kept for those with an account alone, but a request without a moment is refused before that.
    const writing = [paths.notes(':id'), paths.readNotes(':id'), paths.takeComplaints(':id')];
    expect(open.sort()).toEqual([...reading, ...writing.map((path) => `post ${path}`)].sort());
  });

  it('of a take answers 404 to its owner once it is deleted, save for bringing it back', async () => {
    const take = await juno.makeTake();
    await juno.delete(paths.take(take.id)).expect(204);
    const restore = paths.restoreTake(':id');
    for (const route of takeRoutes().filter(({ path }) => path !== restore)) {
      const response = await send(juno, filled(route, take.id, take.files[0].id));
      expect([route, response.status]).toEqual([route, 404]);
    }
  });

  it('refuses writes from elsewhere, whoever is signed in', async () => {
    const take = await juno.makeTake();
    // Mail programs call it by themselves; it acts on its token alone.
    const fromElsewhere = ({ path }: Route) => path === paths.stopMail;
    for (const route of routes.filter((each) => each.method !== 'get' && !fromElsewhere(each))) {
      const sent = send(juno, filled(route, take.id, take.files[0].id)).set(
        'Origin',
        'http://elsewhere.test',
      );
      expect([route, (await sent).status]).toEqual([route, 403]);
    }
  });

  it('stands in the OpenAPI document with the access it asks for', () => {
    const document = openApiDocument(test.app);
    for (const { method, path } of routes) {
      const documented = path.replace(/:(\w+)/g, '{$1}');
      const operation = (document.paths[documented] as Record<string, Record<string, unknown>> | undefined)?.[
        method
      ];
      expect([method, path, operation?.['x-access']]).toEqual([method, path, expect.any(String)]);
    }
  });
});
